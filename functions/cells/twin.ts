/**
 * A function as ordinary spreadsheet arithmetic, for readers without the add-in and for auditors. Formulas are plain
 * spreadsheet syntax over names: those of the inputs, of the steps above, of the constants by their CODATA symbol, and
 * for an ion M (mass, kg) and Z (charge number). Where an input is a list of ions, M, Z and every other list stand for
 * the whole list in a step, and for one row of it in a formula by column.
 *
 * They are written from the equation, not from the model's code: a spreadsheet that finds the same value checks both.
 */
export interface Twin {
  /** What a blank input stands for where the entry itself has no such number or word. */
  blanks?: Readonly<Record<string, number | string>>;
  steps?: readonly Step[];
  /** The result, or for a table of one row per listed ion the result of each numeric column by its name. */
  formula: string | Readonly<Record<string, string>>;
  /** Words for which there is no such formula, by input. */
  except?: Readonly<Record<string, readonly string[]>>;
  /** What the function refuses and the formula does not notice. */
  untested?: string;
}

export interface Step {
  name: string;
  unit: string;
  formula: string;
}
