import { argon, e, m_e, type Column } from "./constants";

export const negativeIons = {
  NEGATIVEIONBOHMSPEED(T_e: Column, alpha_s: Column, gamma: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++)
      out[i] = [Math.sqrt((((e * T_e[i][0]) / argon) * (1 + alpha_s[i][0])) / (1 + alpha_s[i][0] * gamma[i][0]))];
    return out;
  },

  NEGATIVEIONFLUX(n_edge: Column, T_e: Column, alpha_s: Column, gamma: Column): Column {
    const out = new Array(n_edge.length);
    for (let i = 0; i < n_edge.length; i++)
      out[i] = [
        n_edge[i][0] *
          (1 + alpha_s[i][0]) *
          Math.sqrt((((e * T_e[i][0]) / argon) * (1 + alpha_s[i][0])) / (1 + alpha_s[i][0] * gamma[i][0])),
      ];
    return out;
  },

  NEGATIVEIONPOTENTIAL(T_e: Column, alpha_s: Column, gamma: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) {
      const u = Math.sqrt((((e * T_e[i][0]) / argon) * (1 + alpha_s[i][0])) / (1 + alpha_s[i][0] * gamma[i][0]));
      out[i] = [
        -T_e[i][0] * Math.log(Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e)) / (4 * (1 + alpha_s[i][0]) * u)),
      ];
    }
    return out;
  },
};
