import { argon, e, m_e, type Column } from "./constants";

/** n_edge/n_bulk where none is given. */
const ratio = Math.exp(-0.5);

export const probe = {
  PROBEDENSITY(I_sat: Column, area: Column, T_e: Column): Column {
    const out = new Array(I_sat.length);
    for (let i = 0; i < I_sat.length; i++)
      out[i] = [I_sat[i][0] / (ratio * e * area[i][0] * Math.sqrt((e * T_e[i][0]) / argon))];
    return out;
  },

  PROBETEMPERATURE(V_p: Column, V_f: Column): Column {
    const out = new Array(V_p.length);
    for (let i = 0; i < V_p.length; i++)
      out[i] = [(V_p[i][0] - V_f[i][0]) / (Math.log(Math.sqrt(argon / (2 * Math.PI * m_e))) - Math.log(ratio))];
    return out;
  },

  ORBITALCURRENT(V: Column, n_bulk: Column, radius: Column, length: Column): Column {
    const out = new Array(V.length);
    for (let i = 0; i < V.length; i++)
      out[i] = [
        2 *
          Math.PI *
          radius[i][0] *
          length[i][0] *
          n_bulk[i][0] *
          e *
          (Math.SQRT2 / Math.PI) *
          Math.sqrt((e * V[i][0]) / argon),
      ];
    return out;
  },

  ORBITALDENSITY(I: Column, V: Column, radius: Column, length: Column): Column {
    const out = new Array(I.length);
    for (let i = 0; i < I.length; i++)
      out[i] = [
        I[i][0] /
          (2 * Math.PI * radius[i][0] * length[i][0] * e * (Math.SQRT2 / Math.PI) * Math.sqrt((e * V[i][0]) / argon)),
      ];
    return out;
  },
};
