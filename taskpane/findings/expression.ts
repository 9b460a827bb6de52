import {
  parse,
  parseR1C1Ref,
  parseStructRef,
  tokenize,
  translateTokensToR1C1,
  type AstExpression,
  type ReferenceIdentifier,
} from "@borgar/fx";
import { a1, type Cell } from "../workbook/address";

/** One coordinate of a reference: a row or column of the sheet, or an offset from the formula's own cell. */
export interface Coordinate {
  at: number;
  absolute: boolean;
}

/** A parsed formula, the same for every cell that holds it in relative form. */
export type Expression =
  | { is: "constant"; cells: unknown[][] }
  | {
      is: "range";
      sheet?: string;
      /** Undefined where whole columns are meant. */
      rows?: [Coordinate, Coordinate];
      /** Undefined where whole rows are meant. */
      columns?: [Coordinate, Coordinate];
    }
  | { is: "name"; name: string }
  | { is: "table"; table: string; columns: readonly string[]; sections: readonly string[] }
  | { is: "unary"; operator: string; of: Expression }
  | { is: "binary"; operator: string; left: Expression; right: Expression }
  | { is: "let"; names: readonly { name: string; value: Expression }[]; body: Expression }
  /** One of our functions; `id` tells the calls of one formula apart. */
  | { is: "sheath"; name: string; args: readonly (Expression | undefined)[]; id: number }
  /** A function of the host. */
  | { is: "native"; name: string; args: readonly (Expression | undefined)[] }
  | { is: "unknown"; why: string };

export interface Parsed {
  /** The formula with references relative to its cell: equal in every cell of a filled column. */
  form: string;
  expression: Expression;
  /** Names of our functions in it, in order; one for each call. */
  calls: readonly string[];
}

/** Parses formulas, each distinct relative form once. */
export class Parser {
  private readonly forms = new Map<string, Parsed>();

  /** What was parsed for a relative form met before. */
  known(form: string): Parsed {
    return this.forms.get(form)!;
  }

  parse(formula: string, cell: Cell): Parsed {
    const tokens = relativeTokens(formula, cell);
    if (!tokens) return this.remember(formula, () => unreadable);
    const form = tokens.map(({ value }) => value).join("");
    return this.remember(form, () => parse(tokens));
  }

  private remember(form: string, ast: () => AstExpression | typeof unreadable): Parsed {
    const known = this.forms.get(form);
    if (known) return known;
    const calls: string[] = [];
    const parsed = { form, expression: guarded(ast, calls), calls };
    this.forms.set(form, parsed);
    return parsed;
  }
}

const unreadable = Symbol("unreadable");

function relativeTokens(formula: string, cell: Cell) {
  try {
    return translateTokensToR1C1(tokenize(formula), a1(cell));
  } catch {
    return undefined;
  }
}

function guarded(ast: () => AstExpression | typeof unreadable, calls: string[]): Expression {
  try {
    const read = ast();
    if (read !== unreadable) return compile(read, calls);
  } catch {
    // What the parser does not take is told as such below.
  }
  return { is: "unknown", why: "the formula could not be read" };
}

/** The name of one of our functions from how a formula or a saved file spells it. */
export function sheathName(callee: string): string | undefined {
  return /^(?:_xldudf_)?SHEATH[._](.+)$/i.exec(callee)?.[1].toUpperCase();
}

function compile(node: AstExpression, calls: string[]): Expression {
  switch (node.type) {
    case "Literal":
      return { is: "constant", cells: [[node.value]] };
    case "ErrorLiteral":
      return { is: "constant", cells: [[{ code: node.value }]] };
    case "ArrayExpression":
      return arrayOf(node.elements);
    case "ReferenceIdentifier":
      return reference(node);
    case "UnaryExpression":
      return { is: "unary", operator: node.operator, of: compile(node.arguments[0], calls) };
    case "BinaryExpression": {
      const [left, right] = node.arguments.map((each) => compile(each, calls));
      return { is: "binary", operator: node.operator, left, right };
    }
    case "LetExpression":
      return letOf(node, calls);
    case "CallExpression":
      return callOf(node.callee, node.arguments as (AstExpression | null)[], calls);
    default:
      return { is: "unknown", why: `${node.type} is not followed` };
  }
}

function arrayOf(elements: readonly (readonly AstExpression[])[]): Expression {
  const rows = elements.map((row) => row.map((each) => compile(each, [])));
  if (rows.some((row) => row.some((each) => each.is !== "constant")))
    return { is: "unknown", why: "an array of calls" };
  return { is: "constant", cells: rows.map((row) => row.map((each) => (each as { cells: unknown[][] }).cells[0][0])) };
}

function letOf(node: Extract<AstExpression, { type: "LetExpression" }>, calls: string[]): Expression {
  const names = node.declarations.map(({ id, init }) => ({
    name: id.name.toLowerCase(),
    value: init ? compile(init as AstExpression, calls) : ({ is: "unknown", why: "LET without a value" } as const),
  }));
  const body = node.body
    ? compile(node.body as AstExpression, calls)
    : { is: "unknown" as const, why: "LET without a result" };
  return { is: "let", names, body };
}

function callOf(callee: { name: string }, nodes: readonly (AstExpression | null)[], calls: string[]): Expression {
  const ours = sheathName(callee.name);
  const id = calls.length;
  if (ours !== undefined) calls.push(ours);
  const args = nodes.map((node) => (node ? compile(node, calls) : undefined));
  if (ours !== undefined) return { is: "sheath", name: ours, args, id };
  const name = callee.name.replace(/^(_xlfn\.|_xlws\.)+/i, "").toUpperCase();
  // How a saved file spells A1# and @A1:A5.
  if (name === "ANCHORARRAY" && args[0]) return { is: "unary", operator: "#", of: args[0] };
  if (name === "SINGLE" && args[0]) return { is: "unary", operator: "@", of: args[0] };
  return { is: "native", name, args };
}

function reference({ value, kind }: ReferenceIdentifier): Expression {
  if (kind === "table") return tableReference(value);
  const found = parseR1C1Ref(value);
  if (!found || /\.:|:\./.test(value)) return { is: "unknown", why: `${value} is not followed` };
  const context = found.context ?? [];
  if (context.length > 1) return { is: "unknown", why: "it refers to another workbook" };
  const sheet: string | undefined = context[0];
  if (sheet?.includes(":")) return { is: "unknown", why: "it refers to several sheets at once" };
  if ("name" in found) return { is: "name", name: sheet === undefined ? found.name : `${sheet}!${found.name}` };
  const { r0, r1, c0, c1, $r0, $r1, $c0, $c1 } = found.range as Record<string, any>;
  return {
    is: "range",
    ...(sheet === undefined ? {} : { sheet }),
    ...(typeof r0 === "number" ? { rows: [coordinate(r0, $r0), coordinate(r1 ?? r0, $r1 ?? $r0)] } : {}),
    ...(typeof c0 === "number" ? { columns: [coordinate(c0, $c0), coordinate(c1 ?? c0, $c1 ?? $c0)] } : {}),
  };
}

function coordinate(at: number, absolute: boolean): Coordinate {
  return { at, absolute };
}

function tableReference(value: string): Expression {
  const found = parseStructRef(value);
  if (!found) return { is: "unknown", why: `${value} is not followed` };
  return { is: "table", table: found.table ?? "", columns: found.columns ?? [], sections: found.sections ?? [] };
}
