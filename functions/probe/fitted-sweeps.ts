import { Fault } from "../cells/fault";
import type { Series } from "../cells/series";
import { fitCharacteristic, type ProbeResult } from "./fit";
import { splitSweeps, type Labels } from "./sweeps";

/** One sweep fitted, or in words why it is not; and what was done to its readings. */
export interface FittedSweep {
  label: number | string;
  result: ProbeResult | string;
  notes: readonly string[];
}

/** All sweeps in two columns. */
export function fitSweeps(V: Series, I: Series, labels: Labels | undefined): FittedSweep[] | Fault {
  const known = fitted.get(V);
  if (known?.I === I && known.labels === labels) return known.sweeps;
  const sweeps = fitAll(V, I, labels);
  fitted.set(V, { I, labels, sweeps });
  return sweeps;
}

/** The limits ask for the same fits as the function itself. */
const fitted = new WeakMap<Series, { I: Series; labels: Labels | undefined; sweeps: FittedSweep[] | Fault }>();

function fitAll(V: Series, I: Series, labels: Labels | undefined): FittedSweep[] | Fault {
  const sweeps = splitSweeps(V, I, labels);
  if (sweeps instanceof Fault) return sweeps;
  const units = [V, I].flatMap(({ name, unit }) => (unit ? [`${name} read in ${unit}, as its heading says`] : []));
  return sweeps.map(({ label, readings }) => {
    if (typeof readings === "string") return { label, result: readings, notes: units };
    return { label, result: fitCharacteristic(readings.curve), notes: [...readings.notes, ...units] };
  });
}
