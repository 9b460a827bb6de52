/** What a call in every row costs beside one call over all rows: tables and old habits want the former. */
import { builtFunctions } from "./build";
import { measureTogether, sweep, type Row } from "./measure";

export function fillDown(): Row[] {
  const doors = builtFunctions();
  const rows = 20_000;
  const n = sweep(1e14, 1e19, rows);
  const T = sweep(1, 20, rows);
  const single = n.map((_, i) => [[n[i]], [T[i]]]);
  const [debyeRange, debyeDown, checkRange, checkDown] = measureTogether([
    () => doors.DEBYELENGTH(n, T),
    () => single.forEach(([n_e, T_e]) => doors.DEBYELENGTH(n_e, T_e)),
    () => doors.LIMITCHECK([["DEBYELENGTH"]], n, T),
    () => single.forEach(([n_e, T_e]) => doors.LIMITCHECK([["DEBYELENGTH"]], n_e, T_e)),
  ]);
  const each = (time: number) => (1000 * time) / rows;
  return [
    { what: "DEBYELENGTH, a call in each of 20,000 rows", value: debyeDown / debyeRange, unit: "× one call" },
    { what: "DEBYELENGTH, a call in each row", value: each(debyeDown), unit: "µs a row" },
    { what: "LIMITCHECK, a call in each of 20,000 rows", value: checkDown / checkRange, unit: "× one call" },
    { what: "LIMITCHECK, a call in each row", value: each(checkDown), unit: "µs a row" },
  ];
}
