/**
 * What an engineer would write by hand for one function over nested arrays as the host hands them over: no checks, no
 * units. The yardstick for what reading cells costs.
 */
const e = 1.602176634e-19;
const eps0 = 8.8541878188e-12;
const u = 1.66053906892e-27;
const argon = 39.948 * u;

type Column = number[][];

export const handLoops = {
  DEBYELENGTH(n: Column, T: Column): number[][] {
    const out = new Array(n.length);
    for (let i = 0; i < n.length; i++) out[i] = [Math.sqrt((eps0 * T[i][0]) / (e * n[i][0]))];
    return out;
  },
  WALLFLUX(n: Column, T: Column): number[][] {
    const out = new Array(n.length);
    const ratio = Math.exp(-0.5);
    for (let i = 0; i < n.length; i++) out[i] = [ratio * n[i][0] * Math.sqrt((e * T[i][0]) / argon)];
    return out;
  },
};
