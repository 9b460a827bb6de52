import type { Value } from "../cells/entry";
import { format } from "../cells/format";
import { freeEdgeRatio } from "../edge/model";
import type { Ion } from "../matter/ion";
import { logBesselI0 } from "../numerics/bessel";
import { findRoot } from "../numerics/root";
import type { Estimate, Floating, ProbeResult } from "./fit";
import { floatingDepth, probeDensity } from "./model";
import type { ProbePart } from "./parts";

/** One sweep's row by the names of its columns; "" where it has no value, and why stands in the remarks. */
export type Row = Record<ProbePart, Value>;

export function rowOf(
  sweep: number | string,
  result: ProbeResult | string,
  notes: readonly string[],
  area: number | undefined,
  ion: Ion | undefined,
): Row {
  if (typeof result === "string") return { ...blank, sweep, remarks: [result, ...notes].join("; ") };
  const { T_e, floating, knee } = result;
  const V_p = knee ? { ...knee.V, from: "knee" } : floating && ion ? fromFloating(result, floating, ion) : undefined;
  const n = floating && ion && area !== undefined ? densityOf(result, floating, area, ion) : undefined;
  const remarks = [...remarksOn(result, V_p, ion), ...notes];
  return {
    sweep,
    T_e: T_e.value,
    T_e_error: T_e.error,
    V_f: floating?.V_f.value ?? "",
    V_f_error: floating?.V_f.error ?? "",
    V_p: V_p?.value ?? "",
    V_p_error: V_p?.error ?? "",
    V_p_from: V_p?.from ?? "",
    I_sat: floating?.I_sat.value ?? "",
    I_sat_error: floating?.I_sat.error ?? "",
    n_bulk: n?.value ?? "",
    n_bulk_error: n?.error ?? "",
    window_from: result.window[0],
    window_to: result.window[1],
    points: result.points,
    remarks: remarks.join("; "),
  };
}

const blank: Row = {
  sweep: "",
  T_e: "",
  T_e_error: "",
  V_f: "",
  V_f_error: "",
  V_p: "",
  V_p_error: "",
  V_p_from: "",
  I_sat: "",
  I_sat_error: "",
  n_bulk: "",
  n_bulk_error: "",
  window_from: "",
  window_to: "",
  points: "",
  remarks: "",
};

/** V_f + T_e (½ + ln √(M/(2πmZ))), where the sweep has no knee. */
function fromFloating({ T_e }: ProbeResult, { V_f, withV_f }: Floating, ion: Ion): Estimate & { from: string } {
  const depth = floatingDepth(ion, freeEdgeRatio);
  const error = Math.sqrt(V_f.error ** 2 + (depth * T_e.error) ** 2 + 2 * depth * withV_f);
  return { value: V_f.value + depth * T_e.value, error, from: "floating" };
}

/** The density goes with I_sat/√T_e, and the errors of the two are not independent. */
function densityOf({ T_e }: ProbeResult, { I_sat, withI_sat }: Floating, area: number, ion: Ion): Estimate {
  const value = probeDensity(I_sat.value, area, T_e.value, ion, freeEdgeRatio, 0);
  const [ofI, ofT] = [I_sat.error / I_sat.value, T_e.error / T_e.value];
  const together = withI_sat / (I_sat.value * T_e.value);
  return { value, error: value * Math.sqrt(ofI ** 2 + 0.25 * ofT ** 2 - together) };
}

function remarksOn(
  result: ProbeResult,
  V_p: (Estimate & { from: string }) | undefined,
  ion: Ion | undefined,
): string[] {
  const { T_e, floating, knee } = result;
  const remarks = result.widened.map((why) => `${why}: errors widened`);
  if (!floating)
    remarks.push("the current never crosses zero: no V_f, I_sat and density; sweep further down, or mend an offset");
  if (!knee) {
    const wanted = V_p ? "V_p is reckoned from V_f" : floating ? "no V_p; give the ion" : "no V_p";
    remarks.push(`no straight electron saturation: ${wanted}, and RF pick-up can't be seen`);
  }
  const swing = swingOf(result);
  if (swing && swing.shift > 0.1 * T_e.value) {
    remarks.push(
      `the knee is rounded as by an RF swing of ${format(swing.amplitude, 2)} V from zero to peak: V_f and V_p then stand ` +
        `${format(swing.shift, 2)} V too low, and T_e may read a few per cent high`,
    );
  }
  if (floating) remarks.push(...remarkOnGrowth(result, floating), ...remarkOnDepth(result, floating, ion));
  return remarks;
}

/** The RF amplitude in V that would round the knee as much, and what it pulls V_f down by; undefined where nothing shows. */
export function swingOf({ T_e, knee }: ProbeResult): { amplitude: number; shift: number } | undefined {
  if (!knee || !(knee.shift.value > 3 * knee.shift.error)) return undefined;
  const shift = knee.shift.value;
  const ratio = shift / T_e.value;
  // x − ln I₀(x) grows as ½ ln(2πx): the bracket holds the root.
  const x = findRoot((x) => logBesselI0(x) - ratio, 0, ratio + 3 + Math.log(1 + ratio));
  return { amplitude: x * T_e.value, shift };
}

/** By Child's law the current grows as 1 + c η^(3/4), so its slope in the middle of the ions' side tells c. */
function remarkOnGrowth({ T_e, knee }: ProbeResult, { V_f, growth, V_ions }: Floating): string[] {
  if (!(growth.value > 2 * growth.error)) return [];
  const top = knee?.V.value ?? V_f.value + 5 * T_e.value;
  const [eta_f, eta_ions] = [(top - V_f.value) / T_e.value, (top - V_ions) / T_e.value];
  const excess = (growth.value * eta_ions ** 0.25 * eta_f ** 0.75) / 0.75;
  if (!(excess > 0.05)) return [];
  const perT = `the ion current grows by ${format(100 * growth.value, 2)} % per T_e`;
  const high = excess < 0.9 ? `about ${format((100 * excess) / (1 - excess), 2)} % ` : "far ";
  return [
    `${perT}: a sheath that widens, which puts I_sat and density ${high}too high and touches T_e, or a few hot electrons`,
  ];
}

/** The depth of V_f below the knee against what the ion's mass asks for. */
function remarkOnDepth({ T_e, knee }: ProbeResult, { V_f }: Floating, ion: Ion | undefined): string[] {
  if (!knee || !ion) return [];
  const wanted = floatingDepth(ion, freeEdgeRatio);
  const depth = (knee.V.value - V_f.value) / T_e.value;
  const error = (Math.hypot(knee.V.error, V_f.error) + depth * T_e.error) / T_e.value;
  if (!(Math.abs(depth - wanted) > Math.max(0.3, 3 * error))) return [];
  return [
    `V_p − V_f is ${format(depth)} T_e where ${ion.label} asks for ${format(wanted)}: an offset in the current, a ` +
      "sheath that widens, electron emission, a magnetic field, or other ions",
  ];
}
