/** The sample workbooks that the build makes, in the order in which they are offered. */
export const samples = [
  { file: "chuck-bias.xlsx", title: "Chuck bias study" },
  { file: "probe-log.xlsx", title: "Probe log of 500 readings" },
  { file: "wall-heat.xlsx", title: "Wall heat-load budget" },
] as const;
