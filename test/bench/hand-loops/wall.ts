import { argon, deuterium, e, h, k_B, m_e, silicon, type Column } from "./constants";

/** n_edge/n_bulk where none is given. */
const ratio = Math.exp(-0.5);
const richardson = (4 * Math.PI * m_e * e * k_B * k_B) / (h * h * h);

export const wall = {
  FLOATINGPOTENTIAL(T_e: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) {
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      const u_B = Math.sqrt((e * T_e[i][0]) / argon);
      out[i] = [-T_e[i][0] * Math.log(speed / (4 * u_B))];
    }
    return out;
  },

  WALLFLUX(n_bulk: Column, T_e: Column): Column {
    const out = new Array(n_bulk.length);
    for (let i = 0; i < n_bulk.length; i++) out[i] = [ratio * n_bulk[i][0] * Math.sqrt((e * T_e[i][0]) / argon)];
    return out;
  },

  IONCURRENTDENSITY(n_bulk: Column, T_e: Column): Column {
    const out = new Array(n_bulk.length);
    for (let i = 0; i < n_bulk.length; i++) out[i] = [e * ratio * n_bulk[i][0] * Math.sqrt((e * T_e[i][0]) / argon)];
    return out;
  },

  ELECTRONFLUX(n_bulk: Column, T_e: Column, V_w: Column): Column {
    const out = new Array(n_bulk.length);
    for (let i = 0; i < n_bulk.length; i++) {
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      out[i] = [0.25 * ratio * n_bulk[i][0] * speed * Math.exp(V_w[i][0] / T_e[i][0])];
    }
    return out;
  },

  WALLCURRENT(V_w: Column, n_bulk: Column, T_e: Column): Column {
    const out = new Array(V_w.length);
    for (let i = 0; i < V_w.length; i++) {
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      out[i] = [
        e *
          ratio *
          n_bulk[i][0] *
          (Math.sqrt((e * T_e[i][0]) / argon) - 0.25 * speed * Math.exp(V_w[i][0] / T_e[i][0])),
      ];
    }
    return out;
  },

  WALLVOLTAGE(J: Column, n_bulk: Column, T_e: Column): Column {
    const out = new Array(J.length);
    for (let i = 0; i < J.length; i++) {
      const n = ratio * n_bulk[i][0];
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      out[i] = [T_e[i][0] * Math.log((e * n * Math.sqrt((e * T_e[i][0]) / argon) - J[i][0]) / (0.25 * e * n * speed))];
    }
    return out;
  },

  IONIMPACTENERGY(T_e: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) {
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      const u_B = Math.sqrt((e * T_e[i][0]) / argon);
      out[i] = [T_e[i][0] * Math.log(speed / (4 * u_B)) + (argon * u_B * u_B) / (2 * e)];
    }
    return out;
  },

  WALLHEATFLUX(n_bulk: Column, T_e: Column): Column {
    const out = new Array(n_bulk.length);
    for (let i = 0; i < n_bulk.length; i++) {
      const speed = Math.sqrt((8 * e * T_e[i][0]) / (Math.PI * m_e));
      const u_B = Math.sqrt((e * T_e[i][0]) / argon);
      const flux = ratio * n_bulk[i][0] * u_B;
      out[i] = [e * flux * (T_e[i][0] * Math.log(speed / (4 * u_B)) + (argon * u_B * u_B) / (2 * e) + 2 * T_e[i][0])];
    }
    return out;
  },

  HEATFACTOR(T_e: Column, T_i: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) {
      const V =
        T_e[i][0] * Math.log(Math.sqrt((deuterium * T_e[i][0]) / (2 * Math.PI * m_e * (T_e[i][0] + T_i[i][0]))));
      out[i] = [(V + 0.5 * (T_e[i][0] + T_i[i][0]) + 2.5 * T_i[i][0]) / T_e[i][0] + 2];
    }
    return out;
  },

  RICHARDSONCURRENT(T_wall: Column, work_function: Column): Column {
    const out = new Array(T_wall.length);
    for (let i = 0; i < T_wall.length; i++)
      out[i] = [richardson * T_wall[i][0] * T_wall[i][0] * Math.exp((-e * work_function[i][0]) / (k_B * T_wall[i][0]))];
    return out;
  },

  EROSIONRATE(flux: Column, sputter_yield: Column, density: Column): Column {
    const out = new Array(flux.length);
    for (let i = 0; i < flux.length; i++) out[i] = [(flux[i][0] * sputter_yield[i][0] * silicon) / density[i][0]];
    return out;
  },

  IONEMISSION(E_iz: Column, work_function: Column): Column {
    const out = new Array(E_iz.length);
    for (let i = 0; i < E_iz.length; i++) out[i] = [Math.max(0, 0.016 * (E_iz[i][0] - 2 * work_function[i][0]))];
    return out;
  },
};
