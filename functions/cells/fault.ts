/**
 * Why a cell has no number. The host shows a message for these two codes only, so there are no others:
 * "#VALUE!" an input cannot be used, "#N/A" the inputs are fine but the model has no solution there.
 */
export class Fault {
  constructor(
    readonly code: "#VALUE!" | "#N/A",
    readonly message: string,
  ) {}
}

/** An input that cannot be used: which one, what came, what would work. */
export function badInput(name: string, given: string, expected: string): Fault {
  return new Fault("#VALUE!", `${name}: ${given}; ${expected}.`);
}

/** Inputs that are fine where the model has no solution: say the bound that was passed, and what to use instead. */
export function noSolution(message: string): Fault {
  return new Fault("#N/A", message.endsWith(".") ? message : `${message}.`);
}
