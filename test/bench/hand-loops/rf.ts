import { argon, e, eps0, type Column } from "./constants";

/** (200/243) ε₀ √(2e/M) of argon. */
const child = (200 / 243) * eps0 * Math.sqrt((2 * e) / argon);
const ratio = Math.exp(-0.5);

/** ln I₀ by the power series, as far as it counts. */
function logI0(x: number): number {
  let term = 1;
  let sum = 1;
  for (let k = 1; term > 1e-17 * sum; k++) {
    term *= (0.25 * x * x) / (k * k);
    sum += term;
  }
  return Math.log(sum);
}

export const rf = {
  RFFLOATINGSHIFT(V_rf: Column, T_e: Column): Column {
    const out = new Array(V_rf.length);
    for (let i = 0; i < V_rf.length; i++) out[i] = [-T_e[i][0] * logI0(V_rf[i][0] / T_e[i][0])];
    return out;
  },

  IONENERGYSPREAD(V_dc: Column, V_rf: Column, s: Column, f: Column): Column {
    const out = new Array(V_dc.length);
    for (let i = 0; i < V_dc.length; i++)
      out[i] = [
        Math.min(
          ((8 * V_rf[i][0]) / (6 * Math.PI * f[i][0] * s[i][0])) * Math.sqrt((2 * e * V_dc[i][0]) / argon),
          2 * V_rf[i][0],
        ),
      ];
    return out;
  },

  RFCHILDCURRENT(V_dc: Column, s_m: Column): Column {
    const out = new Array(V_dc.length);
    for (let i = 0; i < V_dc.length; i++) out[i] = [(child * V_dc[i][0] ** 1.5) / (s_m[i][0] * s_m[i][0])];
    return out;
  },

  RFSHEATHWIDTH(V_dc: Column, n_edge: Column, T_e: Column): Column {
    const out = new Array(V_dc.length);
    for (let i = 0; i < V_dc.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      out[i] = [Math.sqrt(50 / 27) * (Math.SQRT2 / 3) * debye * ((2 * V_dc[i][0]) / T_e[i][0]) ** 0.75];
    }
    return out;
  },

  SHEATHRESISTANCE(n_bulk: Column, T_e: Column): Column {
    const out = new Array(n_bulk.length);
    for (let i = 0; i < n_bulk.length; i++)
      out[i] = [T_e[i][0] / (e * ratio * n_bulk[i][0] * Math.sqrt((e * T_e[i][0]) / argon))];
    return out;
  },
};
