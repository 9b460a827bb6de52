import type { Step } from "../cells/twin";

export const ratioOfAmplitude: Step = { name: "x", unit: "", formula: "V_rf/T_e" };

const anglesOfHalfTurn = Array.from({ length: 31 }, (_, k) => k + 1).join(",");

/**
 * ln I₀(x) without the Bessel functions of spreadsheets, some of which stop at seven digits and all of which overflow:
 * up to x = 40 from I₀ = (1/π)∫₀^π exp(x cos θ) dθ (Abramowitz & Stegun 9.6.16) by the trapezoidal rule, whose error
 * on a whole period falls faster than any power; beyond, by the asymptotic series (A&S 9.7.1).
 */
export const logBesselI0: Step = {
  name: "ln_I0",
  unit: "",
  formula:
    `IF(x<=40,x+LN((1+EXP(-2*x)+2*SUMPRODUCT(EXP(x*(COS(PI()*{${anglesOfHalfTurn}}/32)-1))))/64),` +
    "x-LN(2*PI()*x)/2+LN(1+1/(8*x)*(1+9/(16*x)*(1+25/(24*x)*(1+49/(32*x)*(1+81/(40*x)*(1+121/(48*x)*(1+169/(56*x)))))))))",
};
