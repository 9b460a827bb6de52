import { Fault, noSolution } from "../cells/fault";
import { format } from "../cells/format";
import type { Ion } from "../matter/ion";
import { currentAbove, numberAbove } from "./crossing";
import type { Eepf } from "./eepf";
import { eepfIonDemand } from "./model";
import { moments } from "./product-integration";
import { coverage } from "./results";

/** e-folds of the tail that must be measured beyond |V|: less leaves more than 4 % of the crossing electrons to a guess. */
const efolds = 5;

/** The potential V in V at which ∫ (E − |V|) F dE over E > |V| balances the ions; or why the measurement can't tell. */
export function eepfFloating(eepf: Eepf, ion: Ion): number | Fault {
  const { crossing, tail } = eepf;
  const demand = eepfIonDemand(eepf.sums, ion);
  const size = eepf.pieces.length;
  if (crossing.current[0] <= demand) {
    return noSolution(
      "The ions arrive as fast as all electrons together, so no wall floats below the sheath edge; check ion.",
    );
  }
  const inTail = crossing.current[size] > demand;
  const V = inTail
    ? tail.from + Math.log(crossing.current[size] / demand) / tail.steepness
    : solveInPiece(eepf, lastAbove(crossing.current, demand), demand);
  const needed = V + efolds * (inTail ? 1 / tail.steepness : energyLeft(eepf, V));
  return tail.from < needed
    ? noSolution(
        `The wall would float near ${format(-V)} V, but the function is known only to ${format(tail.from)} eV; measure it ` +
          `to ${format(needed)} eV, ${efolds} e-folds beyond.`,
      )
    : -V;
}

/** The mean energy in eV that the electrons crossing |V| = V have left: the temperature of the tail there. */
export function energyLeft(eepf: Eepf, V: number): number {
  const k = pieceAt(eepf, V);
  const piece = eepf.pieces[k];
  const beyond = eepf.crossing.number[k + 1];
  const current = eepf.crossing.current[k + 1] + (piece.b - V) * beyond + currentAbove(piece, V);
  return current / (beyond + numberAbove(piece, V));
}

/** 95 % bound in V of the error of V that noise makes: of the crossing current and of the ion demand, over dV. */
export function noiseOfFloating(eepf: Eepf, ion: Ion, V: number): number {
  const { energy, points, weights, variances, sums } = eepf;
  const demand = eepfIonDemand(sums, ion);
  let total = 0;
  for (let i = 0; i < points; i++) {
    const [onScreening, onDensity] = [weights[moments * i], weights[moments * i + 1]];
    const onDemand = demand * ((1.5 * onDensity) / sums[1] - (0.5 * onScreening) / sums[0]);
    const spacing = (energy[Math.min(i + 1, points - 1)] - energy[Math.max(i - 1, 0)]) / 2;
    total += (Math.max(0, energy[i] - V) * spacing - onDemand) ** 2 * variances[i];
  }
  return (coverage(points) * Math.sqrt(total) * energyLeft(eepf, V)) / demand;
}

/** The last index at which the falling currents still exceed the demand. */
function lastAbove(currents: Float64Array, demand: number): number {
  let [low, high] = [0, currents.length - 1];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (currents[middle] > demand) low = middle;
    else high = middle;
  }
  return low;
}

function pieceAt({ pieces }: Eepf, V: number): number {
  let [low, high] = [0, pieces.length];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (pieces[middle].a <= V) low = middle;
    else high = middle;
  }
  return low;
}

/** The crossing current is convex in V: Newton's method from the lower end climbs to the root without passing it. */
function solveInPiece({ pieces, crossing }: Eepf, k: number, demand: number): number {
  const piece = pieces[k];
  const beyond = crossing.number[k + 1];
  let V = piece.a;
  for (let i = 0; i < 60; i++) {
    const current = crossing.current[k + 1] + (piece.b - V) * beyond + currentAbove(piece, V);
    const step = (current - demand) / (beyond + numberAbove(piece, V));
    V = Math.min(V + step, piece.b);
    if (!(Math.abs(step) > 4 * Number.EPSILON * V)) break;
  }
  return V;
}
