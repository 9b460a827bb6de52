/** What the checks cost beside the functions they check. */
import { builtFunctions } from "./build";
import { measureTogether, sweep, type Row } from "./measure";

export function checks(): Row[] {
  const doors = builtFunctions();
  const rows = 100_000;
  const n = sweep(1e14, 1e19, rows);
  const T = sweep(1, 20, rows);
  const [debye, debyeChecked, flux, fluxChecked] = measureTogether([
    () => doors.DEBYELENGTH(n, T),
    () => doors.LIMITCHECK([["DEBYELENGTH"]], n, T),
    () => doors.WALLFLUX(n, T, [["Ar+"]]),
    () => doors.LIMITCHECK([["WALLFLUX"]], n, T, [["Ar+"]]),
  ]);
  const [linear, drawn] = measureTogether([
    () => doors.UNCERTAINTY([["SHEATHWIDTH"]], [[300, 1e16, 3]], [[0.02, 0.1, 0.05]]),
    () => doors.UNCERTAINTY([["SHEATHWIDTH"]], [[300, 1e16, 3]], [[0.02, 0.1, 0.05]], null, [["montecarlo"]]),
  ]);
  return [
    { what: "LIMITCHECK of DEBYELENGTH, 100,000 rows", value: debyeChecked / debye, unit: "× the function" },
    { what: "LIMITCHECK of DEBYELENGTH, 100,000 rows", value: debyeChecked, unit: "ms" },
    { what: "LIMITCHECK of WALLFLUX, 100,000 rows", value: fluxChecked / flux, unit: "× the function" },
    { what: "UNCERTAINTY of SHEATHWIDTH, one row, linear", value: linear, unit: "ms" },
    { what: "UNCERTAINTY of SHEATHWIDTH, one row, 100,000 draws", value: drawn, unit: "ms" },
  ];
}
