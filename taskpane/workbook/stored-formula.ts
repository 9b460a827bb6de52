/**
 * How a formula is spelt in a saved file: without "=", our functions as the host stores them, and functions younger
 * than the file format marked as such.
 */

/** Text and quoted sheet names go first, so that nothing in them counts as a function. */
const parts = /"(?:[^"]|"")*"|'(?:[^']|'')*'|(?:[A-Z_][\w.]*)(?=\s*\()/gi;

/** The formula to store for one as it is typed: "=SHEATH.UNIT(1,"m")" is stored as "_xldudf_SHEATH_UNIT(1,"m")". */
export function toStored(formula: string): string {
  return formula.replace(/^=/, "").replace(parts, (part) => {
    if (/^["']/.test(part)) return part;
    const own = /^SHEATH\.(\w+)$/i.exec(part);
    if (own) return `_xldudf_SHEATH_${own[1].toUpperCase()}`;
    const name = part.toUpperCase();
    if (inWorksheets.has(name)) return `_xlfn._xlws.${name}`;
    return later.has(name) ? `_xlfn.${name}` : part;
  });
}

/** The formula as it is typed for one that a file holds, in any case: LibreOffice stores names in small letters. */
export function fromStored(stored: string): string {
  const typed = stored.replace(parts, (part) => {
    if (/^["']/.test(part)) return part;
    const own = /^(?:_xlfn\.)?_xldudf_SHEATH_(\w+)$/i.exec(part);
    return own ? `SHEATH.${own[1].toUpperCase()}` : part.replace(/^_xlfn\.(?:_xlws\.)?/i, "");
  });
  return typed.startsWith("=") ? typed : `=${typed}`;
}

/** Functions that carry both marks of the file format, [MS-XLSX] 2.2.2. */
const inWorksheets = new Set(["FILTER", "SORT"]);

/** Functions that came after the file format, [MS-XLSX] 2.2.2; the list is from memory. */
const later = new Set(
  `ACOT ACOTH AGGREGATE ARABIC ARRAYTOTEXT BASE BETA.DIST BETA.INV BINOM.DIST BINOM.DIST.RANGE BINOM.INV BITAND BITLSHIFT
  BITOR BITRSHIFT BITXOR BYCOL BYROW CEILING.MATH CEILING.PRECISE CHISQ.DIST CHISQ.DIST.RT CHISQ.INV CHISQ.INV.RT
  CHISQ.TEST CHOOSECOLS CHOOSEROWS COMBINA CONCAT CONFIDENCE.NORM CONFIDENCE.T COT COTH COVARIANCE.P COVARIANCE.S CSC CSCH
  DAYS DECIMAL DROP ERF.PRECISE ERFC.PRECISE EXPAND EXPON.DIST F.DIST F.DIST.RT F.INV F.INV.RT F.TEST FLOOR.MATH
  FLOOR.PRECISE FORECAST.ETS FORECAST.LINEAR FORMULATEXT GAMMA GAMMA.DIST GAMMA.INV GAMMALN.PRECISE GAUSS HSTACK
  HYPGEOM.DIST IFNA IFS IMCOSH IMCOT IMCSC IMCSCH IMSEC IMSECH IMSINH IMTAN ISFORMULA ISOMITTED ISOWEEKNUM LAMBDA LET
  LOGNORM.DIST LOGNORM.INV MAKEARRAY MAP MAXIFS MINIFS MODE.MULT MODE.SNGL MUNIT NEGBINOM.DIST NORM.DIST NORM.INV
  NORM.S.DIST NORM.S.INV NUMBERVALUE PDURATION PERCENTILE.EXC PERCENTILE.INC PERCENTRANK.EXC PERCENTRANK.INC PERMUTATIONA
  PHI POISSON.DIST QUARTILE.EXC QUARTILE.INC RANDARRAY RANK.AVG RANK.EQ REDUCE RRI SCAN SEC SECH SEQUENCE SHEET SHEETS
  SKEW.P SORTBY STDEV.P STDEV.S SWITCH T.DIST T.DIST.2T T.DIST.RT T.INV T.INV.2T T.TEST TAKE TEXTAFTER TEXTBEFORE TEXTJOIN
  TEXTSPLIT TOCOL TOROW UNICHAR UNICODE UNIQUE VALUETOTEXT VAR.P VAR.S VSTACK WEIBULL.DIST WRAPCOLS WRAPROWS XLOOKUP XMATCH
  XOR Z.TEST`.split(/\s+/),
);
