import { argon, e, eps0, k_B, m_e, type Column } from "./constants";

/** n_edge/n_bulk where none is given. */
const ratio = Math.exp(-0.5);

export const edge = {
  WALLTOEDGE(V_wall: Column, V_plasma: Column, T_e: Column): Column {
    const out = new Array(V_wall.length);
    for (let i = 0; i < V_wall.length; i++) out[i] = [V_wall[i][0] - V_plasma[i][0] - T_e[i][0] * Math.log(ratio)];
    return out;
  },

  DEBYELENGTH(n_e: Column, T_e: Column): Column {
    const out = new Array(n_e.length);
    for (let i = 0; i < n_e.length; i++) out[i] = [Math.sqrt((eps0 * T_e[i][0]) / (e * n_e[i][0]))];
    return out;
  },

  PLASMAFREQUENCY(n: Column): Column {
    const out = new Array(n.length);
    for (let i = 0; i < n.length; i++) out[i] = [Math.sqrt((n[i][0] * e * e) / (eps0 * m_e)) / (2 * Math.PI)];
    return out;
  },

  MEANFREEPATH(p: Column): Column {
    const out = new Array(p.length);
    for (let i = 0; i < p.length; i++) out[i] = [(k_B * 300) / (p[i][0] * 1e-18)];
    return out;
  },

  BOHMSPEED(T_e: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) out[i] = [Math.sqrt((e * T_e[i][0]) / argon)];
    return out;
  },

  COLLISIONALBOHMSPEED(T_e: Column, n_edge: Column, lambda_i: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      out[i] = [Math.sqrt((e * T_e[i][0]) / argon) / Math.sqrt(1 + (Math.PI * debye) / (2 * lambda_i[i][0]))];
    }
    return out;
  },

  BOHMRATIO(u_0: Column, T_e: Column): Column {
    const out = new Array(u_0.length);
    for (let i = 0; i < u_0.length; i++) out[i] = [u_0[i][0] / Math.sqrt((e * T_e[i][0]) / argon)];
    return out;
  },

  EDGEDECAYLENGTH(n_edge: Column, T_e: Column, u_0: Column): Column {
    const out = new Array(n_edge.length);
    for (let i = 0; i < n_edge.length; i++) {
      const debye = Math.sqrt((eps0 * T_e[i][0]) / (e * n_edge[i][0]));
      out[i] = [debye / Math.sqrt(1 - (e * T_e[i][0]) / (argon * u_0[i][0] * u_0[i][0]))];
    }
    return out;
  },

  EDGERATIO(size: Column, lambda_i: Column): Column {
    const out = new Array(size.length);
    for (let i = 0; i < size.length; i++) out[i] = [0.86 / Math.sqrt(3 + size[i][0] / (2 * lambda_i[i][0]))];
    return out;
  },

  PRESHEATHDROP(T_e: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) out[i] = [-T_e[i][0] * Math.log(ratio)];
    return out;
  },
};
