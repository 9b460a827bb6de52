import { badInput, Fault } from "../cells/fault";
import { blockInput, type Input } from "../cells/inputs";
import type { Series } from "../cells/series";
import { characteristicOf, type Ordered } from "./characteristic";

/** The readings of one sweep; or, where the sheet has an error among them, which row to mend. */
export interface SweepReadings {
  label: number | string;
  readings: Ordered | string;
}

/** What stands in the sweep column, one label a row; undefined for a blank. */
export type Labels = (number | string | undefined)[];

/** A column of sweep numbers, or of any words that tell sweeps apart. */
export function labelsInput(name: string): Input<Labels> {
  return blockInput(name, (rows) => {
    if (rows.length > 1 && rows[0].length > 1) {
      return badInput(name, `${rows.length} rows by ${rows[0].length} columns are more than one column`, "select one");
    }
    return rows.flat().map((cell) => {
      if (typeof cell === "number") return cell;
      return typeof cell === "string" && cell.trim() !== "" ? cell.trim() : undefined;
    });
  });
}

/** The columns split into sweeps, in the order in which their labels first appear. */
export function splitSweeps(V: Series, I: Series, labels: Labels | undefined): SweepReadings[] | Fault {
  const size = V.values.length;
  for (const [name, length] of [
    ["I", I.values.length],
    ["sweep", labels?.length ?? size],
  ] as const) {
    if (length !== size)
      return badInput(name, `${length} cells do not match the ${size} of V`, "select columns of one length");
  }
  const groups = new Map<number | string, Group>();
  for (let i = 0; i < size; i++) {
    if (V.heading[i] || I.heading[i] || (V.blank[i] && I.blank[i])) continue;
    const label = labels ? labels[i] : 1;
    if (label === undefined) return badInput("sweep", `row ${i + 1} is blank`, "give every reading its sweep number");
    let group = groups.get(label);
    if (!group) groups.set(label, (group = { readings: [], unread: 0, error: undefined }));
    if (V.errors.has(i) || I.errors.has(i)) group.error ??= i + 1;
    if (Number.isNaN(V.values[i]) || Number.isNaN(I.values[i])) group.unread++;
    else group.readings.push([V.values[i], I.values[i]]);
  }
  const word = I.word ?? V.word;
  return [...groups].map(([label, group]) => ({ label, readings: ordered(group, word) }));
}

interface Group {
  readings: (readonly [number, number])[];
  unread: number;
  error: number | undefined;
}

function ordered({ readings, unread, error }: Group, word: string | undefined): Ordered | string {
  if (error !== undefined)
    return `row ${error} of the columns holds an error; mend that cell (#N/A counts as no reading)`;
  const sweep = characteristicOf(readings);
  if (unread > 0) {
    sweep.notes.unshift(
      `${unread} ${unread === 1 ? "row" : "rows"} without a reading left out${word ? ` ("${word}")` : ""}`,
    );
  }
  return sweep;
}
