/** What findings are grouped by, in the order in which they are shown: what is broken first, then what may be. */
export const causes = {
  error: "Errors",
  passed: "Errors passed along",
  spill: "Blocked spills",
  newer: "Calls this version does not know",
  fails: "Outside a validity limit",
  check: "Failing checks",
  stale: "Saved values that differ from a new calculation",
  overwritten: "Values typed over a formula",
  inconsistent: "Formulas unlike their neighbours",
  doubtful: "Doubtful inputs",
  heading: "Headings in another unit",
  blank: "Blank cells where zero is a value",
  marginal: "Marginal at a validity limit",
} as const;

export type Cause = keyof typeof causes;
