/** A published source, by the short name used throughout. */
export interface Source {
  key: string;
  text: string;
}

const source = (key: string, text: string): Source => ({ key, text });

/** Page numbers were not re-read: a check that quotes a printed value says "from memory" unless it was recomputed. */
export const NRL = source("NRL", "NRL Plasma Formulary");
export const LL = source(
  "LL",
  "Lieberman & Lichtenberg, Principles of Plasma Discharges and Materials Processing, 2nd ed. (2005)",
);
export const R91 = source("R91", "Riemann, J. Phys. D 24 (1991) 493");
export const R95 = source("R95", "Riemann, IEEE Trans. Plasma Sci. 23 (1995) 709");
export const S00 = source("S00", "Stangeby, The Plasma Boundary of Magnetic Fusion Devices (2000)");
export const S12 = source("S12", "Stangeby, Nucl. Fusion 52 (2012) 083012");
export const HW67 = source("HW67", "Hobbs & Wesson, Plasma Phys. 9 (1967) 85");
export const D23 = source("D23", "Dushman, Phys. Rev. 21 (1923) 623");
export const S54 = source("S54", "Sternglass, Scientific Paper 1772 (1954)");
export const BB68 = source("BB68", "Benoit-Cattin & Bernard, J. Appl. Phys. 39 (1968) 5723");
export const L88 = source("L88", "Lieberman, IEEE Trans. Plasma Sci. 16 (1988) 638");
export const L89 = source("L89", "Lieberman, IEEE Trans. Plasma Sci. 17 (1989) 338");
export const L89J = source("L89J", "Lieberman, J. Appl. Phys. 66 (1989) 2926");
export const DV63 = source("DV63", "Davis & Vanderslice, Phys. Rev. 131 (1963) 219");
export const GE62 = source("GE62", "Garscadden & Emeleus, Proc. Phys. Soc. 79 (1962) 535");
export const BT59 = source("BT59", "Boyd & Thompson, Proc. R. Soc. A 252 (1959) 102");
export const BHC09 = source("BHC09", "Baalrud, Hegna & Callen, Phys. Rev. Lett. 103 (2009) 205002");
export const C82 = source("C82", "Chodura, Phys. Fluids 25 (1982) 1628");
export const C03 = source("C03", "Chen, Langmuir Probe Diagnostics, IEEE-ICOPS mini-course (2003)");
export const MSL26 = source("MSL26", "Mott-Smith & Langmuir, Phys. Rev. 28 (1926) 727");
export const GUM = source("GUM", "JCGM 100:2008, Guide to the expression of uncertainty in measurement");
export const GUM1 = source("GUM1", "JCGM 101:2008, Propagation of distributions using a Monte Carlo method");
export const CODATA = source("CODATA", "CODATA 2022 recommended values of the fundamental physical constants");
export const CIAAW = source("CIAAW", "IUPAC/CIAAW standard atomic weights");
export const CP = source("CP", "common practice, no source");
