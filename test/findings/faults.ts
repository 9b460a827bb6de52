import type { Cause } from "../../taskpane/findings/causes";
import { cleanBooks } from "./clean-books";
import { column, one, type SheetModel } from "./sheet-model";

/** A book with one fault in it, and by what and where a look should find it. */
export interface Planted {
  kind: string;
  book: SheetModel;
  causes: Cause[];
  sheet: string;
  /** Any of these cells counts as found. */
  cells: string[];
  /** The row that the fault is in, where it is in one. */
  row?: number;
}

/** Gives whole numbers from 0 up to a bound, in a fixed order. */
export type Pick = (below: number) => number;

type BookName = keyof typeof cleanBooks;

/** Where a table of a clean book stands. */
interface Table {
  book: BookName;
  sheet: string;
  from: number;
  to: number;
  /** Every column with formulas. */
  formulas: string;
}

const chamber: Table = { book: "argon pre-clean", sheet: "Chamber", from: 6, to: 45, formulas: "EFGHIJL" };
const runs: Table = { book: "ion extraction", sheet: "Runs", from: 4, to: 35, formulas: "DEFG" };
const tile: Table = { book: "divertor tile", sheet: "Tile", from: 4, to: 33, formulas: "FGHIK" };
const hot: Table = { book: "hot cathode", sheet: "Cathode", from: 5, to: 29, formulas: "GHIJ" };
const driven: Table = { book: "biased chuck", sheet: "Chuck", from: 4, to: 31, formulas: "GHIJ" };

type Plant = (pick: Pick) => Planted;

/** Something typed into an input column; the formulas of its row show or feel it. */
function typedFault(
  kind: string,
  causes: Cause[],
  sites: readonly [Table, string][],
  value: (was: unknown, pick: Pick) => number | string | null | { error: string },
): Plant {
  return (pick) => {
    const [table, letter] = sites[pick(sites.length)];
    const row = table.from + pick(table.to - table.from + 1);
    const book = open(table);
    book.type(`${letter}${row}`, value(book.typedAt(`${letter}${row}`), pick));
    const cells = [letter, ...table.formulas].map((each) => `${each}${row}`);
    return { kind, book, causes, sheet: table.sheet, cells, row };
  };
}

function open({ book, sheet }: Table): SheetModel {
  return cleanBooks[book]().on(sheet);
}

/** Something done to one formula cell of a filled column. */
function formulaFault(
  kind: string,
  causes: Cause[],
  sites: readonly [Table, string][],
  change: (book: SheetModel, letter: string, row: number, pick: Pick) => void,
): Plant {
  return (pick) => {
    const [table, letter] = sites[pick(sites.length)];
    // Not the first or last two: a formula differs from others only where there are others on both sides.
    const row = table.from + 2 + pick(table.to - table.from - 3);
    const book = open(table);
    change(book, letter, row, pick);
    return { kind, book, causes, sheet: table.sheet, cells: [`${letter}${row}`], row };
  };
}

/** Two arguments the wrong way round, all down a column. */
function swapped(
  table: Table,
  letter: string,
  a: string,
  b: string,
  worked: (at: (address: string) => unknown, row: number) => unknown,
): Plant {
  return () => {
    const book = open(table);
    const rows = column("", table.from, table.to).map(Number);
    for (const row of rows) {
      const change = (text: string) =>
        text.replace(new RegExp(`${a}${row}|${b}${row}`, "g"), (each) => (each[0] === a ? b : a) + row);
      book.retext(`${letter}${row}`, change, (at) => worked(at, row));
    }
    const cells = rows.flatMap((row) => [letter, a, b].map((each) => `${each}${row}`));
    return {
      kind: "swapped arguments",
      book,
      causes: ["doubtful", "fails", "error", "heading"],
      sheet: table.sheet,
      cells,
    };
  };
}

const perRow: readonly [Table, string][] = [
  [chamber, "E"],
  [chamber, "H"],
  [runs, "D"],
  [runs, "E"],
  [runs, "F"],
  [tile, "G"],
  [tile, "I"],
  [tile, "K"],
  [hot, "G"],
  [hot, "H"],
  [hot, "I"],
  [hot, "J"],
  [driven, "G"],
  [driven, "H"],
];
const spilled: readonly [Table, string][] = [
  [chamber, "F"],
  [chamber, "G"],
  [runs, "G"],
  [tile, "F"],
  [driven, "I"],
];

const times = (factor: number) => (was: unknown) => Number(was) * factor;

export const faults: readonly Plant[] = [
  typedFault(
    "density typed in cm⁻³",
    ["doubtful"],
    [
      [chamber, "C"],
      [runs, "C"],
      [driven, "E"],
    ],
    times(1e-6),
  ),
  typedFault(
    "temperature typed in kelvin",
    ["doubtful"],
    [
      [chamber, "D"],
      [driven, "F"],
      [hot, "D"],
      [tile, "C"],
    ],
    times(11604.5),
  ),
  typedFault("ions at room temperature in kelvin", ["doubtful"], [[tile, "D"]], (_, pick) => 293 + pick(60)),
  typedFault("field typed in gauss", ["doubtful"], [[tile, "J"]], times(1e4)),
  typedFault(
    "unit of another quantity",
    ["error"],
    [
      [chamber, "C"],
      [tile, "B"],
      [runs, "C"],
      [driven, "E"],
    ],
    () => "5 mTorr",
  ),
  typedFault(
    "no reading",
    ["error"],
    [
      [chamber, "C"],
      [chamber, "D"],
      [tile, "C"],
      [hot, "D"],
      [driven, "F"],
    ],
    (_, pick) => ["OL", "n/a", "---"][pick(3)],
  ),
  typedFault(
    "negative density",
    ["error"],
    [
      [chamber, "C"],
      [runs, "C"],
      [driven, "E"],
    ],
    times(-1),
  ),
  typedFault("row outside a limit: electrons too hot", ["fails"], [[chamber, "D"]], (_, pick) => 26 + pick(10)),
  typedFault("row outside a limit: voltage too low", ["fails"], [[runs, "B"]], (_, pick) => 20 + pick(80)),
  typedFault("row outside a limit: grazing field", ["fails"], [[tile, "E"]], (_, pick) => 0.3 + 0.04 * pick(15)),
  typedFault("row outside a limit: RF sheath too low", ["fails"], [[driven, "C"]], (_, pick) => -5 - pick(14)),
  typedFault(
    "measured value far off",
    ["check"],
    [[chamber, "K"]],
    (was, pick) => Number(was) * (pick(2) ? 1.2 : 0.85),
  ),
  typedFault("emission beyond its limit", ["error"], [[hot, "F"]], (_, pick) => 0.95 + 0.004 * pick(12)),
  typedFault(
    "reading left blank",
    ["blank"],
    [
      [hot, "B"],
      [hot, "C"],
    ],
    () => null,
  ),
  typedFault(
    "density left blank",
    ["error"],
    [
      [chamber, "C"],
      [runs, "C"],
      [driven, "E"],
    ],
    () => null,
  ),
  typedFault(
    "error from another cell",
    ["passed"],
    [
      [chamber, "C"],
      [chamber, "D"],
      [runs, "B"],
      [tile, "D"],
      [hot, "E"],
      [driven, "F"],
    ],
    (_, pick) => ({ error: ["#DIV/0!", "#REF!", "#N/A"][pick(3)] }),
  ),
  swapped(chamber, "E", "C", "D", (at, r) => one("DEBYELENGTH", at(`D${r}`), at(`C${r}`), null, "mm")),
  swapped(chamber, "H", "C", "D", (at, r) => one("WALLFLUX", at(`D${r}`), at(`C${r}`), at("B2"))),
  swapped(hot, "G", "B", "C", (at, r) => one("WALLTOEDGE", at(`C${r}`), at(`B${r}`), at(`D${r}`))),
  swapped(tile, "K", "D", "J", (at, r) => one("GYRORADIUS", at(`J${r}`), at(`D${r}`), "D+", "mm")),
  formulaFault("stale value", ["stale"], [...perRow, ...spilled], (book, letter, row, pick) => {
    const now = Number(book.valueAt(`${letter}${row}`));
    book.save(`${letter}${row}`, now * (1 + 10 ** -(1 + pick(7))));
  }),
  formulaFault("overwritten formula", ["overwritten"], [...perRow, [chamber, "I"]], (book, letter, row, pick) => {
    const now = Number(book.valueAt(`${letter}${row}`));
    book.overwrite(`${letter}${row}`, pick(3) ? Number((now * 1.1).toPrecision(3)) : now);
  }),
  formulaFault(
    "one formula reads the row above",
    ["inconsistent"],
    [
      [chamber, "E"],
      [chamber, "H"],
      [driven, "H"],
    ],
    (book, letter, row) => {
      const own = new RegExp(`\\b([A-Z])${row}\\b`, "g");
      const name = {
        E: "DEBYELENGTH",
        H: letter === "H" && book.textAt(`H${row}`)!.includes("WALLFLUX") ? "WALLFLUX" : "RFSHEATHWIDTH",
      }[letter]!;
      const tail = name === "DEBYELENGTH" ? [null, "mm"] : name === "WALLFLUX" ? ["Ar+"] : [];
      const read = name === "RFSHEATHWIDTH" ? ["C", "E", "F"] : ["C", "D"];
      const cells = (at: (address: string) => unknown) =>
        read.map((each, i) =>
          name === "RFSHEATHWIDTH" && i === 0 ? Math.abs(Number(at(`${each}${row - 1}`))) : at(`${each}${row - 1}`),
        );
      book.retext(
        `${letter}${row}`,
        (text) => text.replace(own, `$1${row - 1}`),
        (at) => one(name, ...cells(at), ...tail),
      );
    },
  ),
  formulaFault("call of a newer function", ["newer"], perRow, (book, letter, row) => {
    const now = book.valueAt(`${letter}${row}`);
    book.retext(
      `${letter}${row}`,
      (text) => text.replace(/SHEATH\.[A-Z]+/, "SHEATH.HALOCURRENT"),
      () => now,
    );
  }),
  formulaFault(
    "call with an argument of a newer version",
    ["newer"],
    [
      [chamber, "E"],
      [hot, "H"],
      [tile, "I"],
    ],
    (book, letter, row) => {
      const now = book.valueAt(`${letter}${row}`);
      book.retext(
        `${letter}${row}`,
        (text) => text.replace(/\)$/, ',,,,"new")'),
        () => now,
      );
    },
  ),
  (pick) => {
    const [table, letter] = spilled[pick(spilled.length)];
    const book = open(table).type(`${letter}${table.from + 1 + pick(table.to - table.from)}`, "remark");
    return { kind: "blocked spill", book, causes: ["spill"], sheet: table.sheet, cells: [`${letter}${table.from}`] };
  },
  (pick) => {
    const [letter, unit] = [
      ["C", "cm⁻³"],
      ["D", "K"],
      ["E", "µm"],
    ][pick(3)];
    const book = open(chamber).type(`${letter}5`, unit);
    return { kind: "heading in another unit", book, causes: ["heading"], sheet: "Chamber", cells: [`${letter}6`] };
  },
];
