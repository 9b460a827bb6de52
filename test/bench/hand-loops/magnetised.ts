import { argon, deuterium, e, m_e, type Column } from "./constants";

export const magnetised = {
  GYRORADIUS(T: Column, B: Column): Column {
    const out = new Array(T.length);
    for (let i = 0; i < T.length; i++) out[i] = [Math.sqrt(e * T[i][0] * argon) / (e * B[i][0])];
    return out;
  },

  MAGNETICPRESHEATHWIDTH(T_e: Column, B: Column, angle: Column, T_i: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++)
      out[i] = [
        ((Math.sqrt(6) * Math.sqrt((e * (T_e[i][0] + T_i[i][0])) / deuterium) * deuterium) / (e * B[i][0])) *
          Math.cos((angle[i][0] * Math.PI) / 180),
      ];
    return out;
  },

  MAGNETICPRESHEATHDROP(T_e: Column, angle: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++) out[i] = [-T_e[i][0] * Math.log(Math.sin((angle[i][0] * Math.PI) / 180))];
    return out;
  },

  GRAZINGLIMIT(T_e: Column, T_i: Column): Column {
    const out = new Array(T_e.length);
    for (let i = 0; i < T_e.length; i++)
      out[i] = [
        (Math.asin(Math.sqrt(((2 * Math.PI * m_e) / deuterium) * (1 + T_i[i][0] / T_e[i][0]))) * 180) / Math.PI,
      ];
    return out;
  },
};
