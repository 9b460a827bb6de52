import { generator } from "../electrons/synthetic-eepf";

/**
 * Characteristics of a small plane probe with a known truth: seeded, sharing no code with functions/. Electrons from the
 * plasma's body up to V_p, ions at the Bohm speed from the sheath edge, and what spoils a measurement on request.
 */
export interface Plasma {
  T_e: number;
  V_p: number;
  n: number;
  /** Ion mass in u. */
  mass: number;
  /** m². */
  area: number;
}

export interface Spoilers {
  /** Zero-to-peak RF swing across the sheath, V. */
  rf?: number;
  /** Ion current grows as 1 + expansion·η^(3/4), η = (V_p − V)/T_e: Child's law. */
  expansion?: number;
  /** Share and temperature of a second electron group. */
  hot?: [share: number, T_h: number];
  /** Growth of the electron current beyond V_p, per T_e. */
  saturationSlope?: number;
  /** A constant error of the current, A. */
  offset?: number;
}

const e = 1.602176634e-19;
const m_e = 9.1093837139e-31;
const u = 1.66053906892e-27;

/** What an ideal probe would say of this plasma. */
export function truthOf({ T_e, V_p, n, mass, area }: Plasma) {
  const u_B = Math.sqrt((e * T_e) / (mass * u));
  const ionCurrent = area * e * n * Math.exp(-0.5) * u_B;
  const saturation = 0.25 * area * e * n * Math.sqrt((8 * e * T_e) / (Math.PI * m_e));
  return { T_e, V_p, n, V_f: V_p - T_e * Math.log(saturation / ionCurrent), I_sat: ionCurrent, saturation };
}

/** Current out of the probe at V, electrons positive. */
function current(V: number, plasma: Plasma, spoilers: Spoilers): number {
  const { T_e, V_p, area, n } = plasma;
  const { I_sat } = truthOf(plasma);
  const drop = V - V_p;
  const groups: [number, number][] = spoilers.hot
    ? [
        [1 - spoilers.hot[0], T_e],
        [spoilers.hot[0], spoilers.hot[1]],
      ]
    : [[1, T_e]];
  const beyond = 1 + (spoilers.saturationSlope ?? 0) * Math.max(0, drop / T_e);
  const electrons = groups.reduce((sum, [share, T]) => {
    const random = 0.25 * area * e * n * share * Math.sqrt((8 * e * T) / (Math.PI * m_e));
    return sum + random * Math.exp(Math.min(0, drop / T)) * beyond;
  }, 0);
  const growth = 1 + (spoilers.expansion ?? 0) * Math.max(0, -drop / T_e) ** 0.75;
  // Cold ions turn back as soon as the probe repels them.
  return electrons - (drop < 0 ? I_sat * growth : 0);
}

/** The same averaged over an RF cycle. */
export function averageCurrent(V: number, plasma: Plasma, spoilers: Spoilers = {}): number {
  const { rf = 0, offset = 0 } = spoilers;
  if (rf === 0) return current(V, plasma, spoilers) + offset;
  const phases = 48;
  let sum = 0;
  for (let k = 0; k < phases; k++)
    sum += current(V + rf * Math.cos((2 * Math.PI * (k + 0.5)) / phases), plasma, spoilers);
  return sum / phases + offset;
}

/** Noise of a sweep: a constant one as a share of the electron saturation, and one in proportion to the current. */
export interface NoiseLevel {
  floor: number;
  relative: number;
}

export interface Sweep {
  V: number[];
  I: number[];
}

export function sweep(
  seed: number,
  plasma: Plasma,
  voltages: readonly number[],
  { floor, relative }: NoiseLevel,
  spoilers: Spoilers = {},
): Sweep {
  const random = generator(seed);
  const { saturation } = truthOf(plasma);
  const I = voltages.map((V) => {
    const exact = averageCurrent(V, plasma, spoilers);
    return exact * (1 + relative * random.normal()) + floor * saturation * random.normal();
  });
  return { V: [...voltages], I };
}

export function voltages(from: number, to: number, step: number): number[] {
  return Array.from({ length: Math.round((to - from) / step) + 1 }, (_, i) => from + i * step);
}

/** A plasma, a sweep plan and a noise drawn from the ranges of the trade. */
export function randomSweep(seed: number, spoilersOf: (T_e: number) => Spoilers = () => ({})) {
  const random = generator(seed * 7919);
  const T_e = random.logBetween(1, 8);
  const plasma: Plasma = {
    T_e,
    V_p: random.between(5, 40),
    n: random.logBetween(1e15, 1e18),
    mass: [4.0026, 39.948, 131.29][Math.floor(3 * random.uniform())],
    area: 1e-5,
  };
  const [below, above, step] = [random.between(12, 25), random.between(3, 8), random.between(0.06, 0.2)];
  const plan = voltages(plasma.V_p - below * T_e, plasma.V_p + above * T_e, step * T_e);
  const noise = { floor: random.logBetween(2e-5, 2e-3), relative: random.logBetween(1e-3, 2e-2) };
  return { plasma, truth: truthOf(plasma), ...sweep(seed, plasma, plan, noise, spoilersOf(T_e)) };
}
