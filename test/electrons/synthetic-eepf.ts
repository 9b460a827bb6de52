/**
 * Measured probability functions with a known truth: seeded, sharing no code with functions/. Closed moments: a Maxwellian
 * n (2/√π) T^(−3/2) exp(−E/T); a Druyvesteyn function C exp(−E²/E₀²), whose ∫ E^p is ½ C E₀^(p+1) Γ((p+1)/2); sums of those.
 */
export interface Truth {
  density: number;
  meanEnergy: number;
  effective: number;
  screening: number;
  flux: number;
}

export interface SyntheticEepf {
  energy: number[];
  eepf: number[];
  truth: Truth;
  shape: string;
}

/** Steele, Lea & Flood's splitmix32 as a uniform generator, with Box & Muller for the normal. */
export function generator(seed: number) {
  let state = seed >>> 0;
  const uniform = () => {
    state = (state + 0x9e3779b9) >>> 0;
    let z = state;
    z = Math.imul(z ^ (z >>> 16), 0x21f0aaad);
    z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
    return ((z ^ (z >>> 15)) >>> 0) / 2 ** 32;
  };
  return {
    uniform,
    between: (low: number, high: number) => low + (high - low) * uniform(),
    logBetween: (low: number, high: number) => low * (high / low) ** uniform(),
    normal: () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform()),
  };
}

/** Γ at the arguments the moments need. */
const gammaAt: Record<number, number> = {
  0.25: 3.625609908221908,
  0.75: 1.2254167024651776,
  1: 1,
  1.25: 0.9064024770554771,
  0.5: Math.sqrt(Math.PI),
  1.5: Math.sqrt(Math.PI) / 2,
  2: 1,
  2.5: (3 * Math.sqrt(Math.PI)) / 4,
};

/** ∫ E^p of exp(−E/T) or of exp(−E²/E₀²). */
const exponential = (T: number, p: number) => T ** (p + 1) * gammaAt[p + 1];
const gaussian = (E_0: number, p: number) => 0.5 * E_0 ** (p + 1) * gammaAt[(p + 1) / 2];

function truthOf(moment: (p: number) => number): Truth {
  const n = moment(0.5);
  const meanEnergy = moment(1.5) / n;
  const speedAtOneEv = Math.sqrt((2 * 1.602176634e-19) / 9.1093837139e-31);
  const flux = 0.25 * speedAtOneEv * moment(1);
  return { density: n, meanEnergy, effective: (2 * meanEnergy) / 3, screening: (2 * n) / moment(-0.5), flux };
}

/** A table as an instrument may give it: its own spacing, first and last energy, and two kinds of noise. */
export function syntheticEepf(seed: number): SyntheticEepf {
  const random = generator(seed);
  const T = random.logBetween(0.8, 8);
  const size = random.logBetween(1e13, 1e17);
  const E_0 = 2 * T;
  const hotT = T * random.between(2, 4);
  const hotShare = random.between(0.005, 0.05);
  const shape = ["Maxwellian", "Druyvesteyn", "two groups"][Math.floor(3 * random.uniform())];
  const F =
    shape === "Maxwellian"
      ? (E: number) => Math.exp(-E / T)
      : shape === "Druyvesteyn"
        ? (E: number) => Math.exp(-((E / E_0) ** 2))
        : (E: number) => Math.exp(-E / T) + hotShare * Math.exp(-E / hotT);
  const moment = (p: number) =>
    size *
    (shape === "Maxwellian"
      ? exponential(T, p)
      : shape === "Druyvesteyn"
        ? gaussian(E_0, p)
        : exponential(T, p) + hotShare * exponential(hotT, p));
  const energy: number[] = [];
  const step = T * random.between(0.04, 0.25);
  const end = T * random.between(7, 16);
  const growth = random.uniform() < 0.5 ? 1 : random.between(1, 1.03);
  const first = random.uniform() < 0.3 ? 0 : T * random.between(0.02, 0.4);
  for (let E = first, h = step; E < end; h *= growth) {
    energy.push(E);
    E += h * random.between(0.7, 1.3);
  }
  const relative = random.logBetween(0.003, 0.05);
  const floor = random.logBetween(1e-5, 3e-3);
  const eepf = energy.map((E) => size * (F(E) * (1 + relative * random.normal()) + floor * random.normal()));
  return { energy, eepf, truth: truthOf(moment), shape };
}
