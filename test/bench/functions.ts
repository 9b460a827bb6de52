/**
 * Every function that gives one quantity a row, at its entry's example: down 100,000 rows in one call and in calls of
 * single cells, the closed forms beside a loop written by hand, all beside DEBYELENGTH.
 */
import { catalogue } from "../../functions/catalogue";
import { isTable, type Entry } from "../../functions/cells/entry";
import { builtFunctions, type Front } from "./build";
import { handLoops } from "./hand-loops";
import { atMost, measureTogether, ratioOf, sweep, type Row } from "./measure";

const rows = 100_000;
/** Calls of single cells are many and short: so many are timed as one. */
const singles = 1000;

type Cells = unknown[][];
type Loop = (...columns: number[][][]) => number[][];

export function functions(): Row[] {
  const doors = builtFunctions();
  const measured = catalogue.filter(isOneQuantity);
  meetAll(measured, doors);
  const debye = columnsOf(
    catalogue.find(({ name }) => name === "DEBYELENGTH")!,
    rows,
  );
  const beside = () => doors.DEBYELENGTH(...debye);
  return [...measured.map((entry) => lineOf(entry, doors, beside)), fullWidth(doors), profile(doors)];
}

/** One number a row; what takes whole columns, or answers in words, is no sweep. */
function isOneQuantity({ inputs, result, name }: Entry): boolean {
  return !isTable(result) && inputs.every(({ kind }) => kind !== "block") && name !== "WITHIN" && name !== "CONSTANT";
}

/** A workbook calls many functions: the compiler must not be able to count on one. */
function meetAll(entries: readonly Entry[], doors: Record<string, Front>): void {
  for (let round = 0; round < 20; round++) {
    for (const entry of entries) {
      doors[entry.name](...columnsOf(entry, 2000));
      doors[entry.name](...columnsOf(entry, 1));
    }
  }
}

function lineOf(entry: Entry, doors: Record<string, Front>, beside: () => unknown): Row {
  const { name } = entry;
  const columns = columnsOf(entry, rows);
  const numbers = columns.filter((column) => column.length > 1) as number[][][];
  const single = columnsOf(entry, 1);
  const call = () => doors[name](...columns);
  const alone = () => {
    for (let i = 0; i < singles; i++) doors[name](...single);
  };
  const [range, calls, debye] = measureTogether([call, alone, beside], { blocks: 5 });
  const also = { "ns a row": (1e6 * range) / rows, "µs a call alone": (1e3 * calls) / singles };
  const multiple = range / debye;
  const loop = (handLoops as Record<string, Loop>)[name];
  if (!loop) return atMost(60, { what: name, value: multiple, unit: "× DEBYELENGTH", also });
  mustAgree(name, call() as number[][], loop(...numbers));
  const value = ratioOf(call, () => loop(...numbers), 1.5);
  return atMost(1.5, { what: name, value, unit: "× hand loop", also: { ...also, "× DEBYELENGTH": multiple } });
}

/** The example's arguments, each number as a column around it. */
function columnsOf({ example }: Entry, length: number): Cells[] {
  return example.map((cell) => {
    if (typeof cell !== "number" || length === 1) return [[cell]];
    return sweep(0.9 * cell, 1.1 * cell, length);
  });
}

/** A loop that computes something else is no yardstick. Masses by hand are the rounded ones. */
function mustAgree(name: string, ours: number[][], byHand: number[][]): void {
  const at = ours.findIndex(([value], i) => !(Math.abs(value / byHand[i][0] - 1) < 1e-4));
  if (at >= 0) throw new Error(`${name} gives ${ours[at][0]} where the loop by hand gives ${byHand[at][0]}.`);
}

function fullWidth(doors: Record<string, Front>): Row {
  const columns = [sweep(30, 3000, rows), sweep(1e14, 1e18, rows), [[3]]];
  const full = () => doors.SHEATHWIDTH(...columns, [["full"]]);
  const child = () => doors.SHEATHWIDTH(...columns, [["child"]]);
  return atMost(40, { what: "SHEATHWIDTH, full", value: ratioOf(full, child, 40), unit: "× child" });
}

function profile(doors: Record<string, Front>): Row {
  const drops = sweep(1, 300, 1000);
  const curve = () => doors.SHEATHPROFILE([[300]], [[1e16]], [[3]], [[null]], [[1000]]);
  const fields = () => doors.WALLFIELD(drops, [[1e16]], [[3]]);
  const value = ratioOf(curve, fields, 100);
  return atMost(100, { what: "SHEATHPROFILE, 1,000 points", value, unit: "× WALLFIELD" });
}
