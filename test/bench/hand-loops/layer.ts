import { argon, e, eps0, nitrogen, type Column } from "./constants";

/** (4/9) ε₀ √(2e/M) of argon. */
const child = (4 / 9) * eps0 * Math.sqrt((2 * e) / argon);

export const layer = {
  SHEATHWIDTH(V_s: Column, n_edge: Column, T_e: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      out[i] = [(Math.SQRT2 / 3) * debye * ((2 * V_s[i][0]) / T_e[i][0]) ** 0.75];
    }
    return out;
  },

  CHILDCURRENT(V_s: Column, s: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) out[i] = [(child * V_s[i][0] ** 1.5) / (s[i][0] * s[i][0])];
    return out;
  },

  CHILDWIDTH(V_s: Column, J: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) out[i] = [Math.sqrt((child * V_s[i][0] ** 1.5) / J[i][0])];
    return out;
  },

  WALLFIELD(V_s: Column, n_edge: Column, T_e: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      const eta = V_s[i][0] / T_e[i][0];
      out[i] = [(T_e[i][0] / debye) * Math.sqrt(2 * (Math.sqrt(1 + 2 * eta) + Math.exp(-eta) - 2))];
    }
    return out;
  },

  IONTRANSITTIME(V_s: Column, s: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) out[i] = [3 * s[i][0] * Math.sqrt(argon / (2 * e * V_s[i][0]))];
    return out;
  },

  SHEATHCAPACITANCE(V_s: Column, n_edge: Column, T_e: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      const eta = V_s[i][0] / T_e[i][0];
      const w = Math.sqrt(1 + 2 * eta);
      const electrons = Math.exp(-eta);
      const field = (T_e[i][0] / debye) * Math.sqrt(2 * (w + electrons - 2));
      out[i] = [(e * n_edge[i][0] * (1 / w - electrons)) / field];
    }
    return out;
  },

  PULSEDWIDTH(V_s: Column, n_edge: Column, T_e: Column, t: Column): Column {
    const out = new Array(V_s.length);
    for (let i = 0; i < V_s.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      const matrix = debye * Math.sqrt((2 * V_s[i][0]) / T_e[i][0]);
      const omega = Math.sqrt((e * e * n_edge[i][0]) / (eps0 * nitrogen));
      out[i] = [
        Math.min(
          matrix * Math.cbrt(1 + (2 / 3) * omega * t[i][0]),
          (Math.SQRT2 / 3) * debye * ((2 * V_s[i][0]) / T_e[i][0]) ** 0.75,
        ),
      ];
    }
    return out;
  },
};
