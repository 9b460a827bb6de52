import { existsSync } from "node:fs";
import { installFromDebian } from "../debian";

const paths = [
  "/usr/bin/soffice",
  "/usr/lib/libreoffice/program/soffice",
  "/Applications/LibreOffice.app/Contents/MacOS/soffice",
];

/** LibreOffice on this machine: the program that SOFFICE_PATH names, else one that is there, else Debian's. */
export function findLibreOffice(packages: readonly string[] = ["libreoffice-calc"]): string {
  const named = process.env.SOFFICE_PATH;
  if (named && !existsSync(named)) throw new Error(`SOFFICE_PATH is ${named}, and there is no such file.`);
  const found = named || paths.find(existsSync);
  if (found) return found;
  const advice = "Install LibreOffice Calc, or set SOFFICE_PATH to the program soffice.";
  installFromDebian(packages, `There is no LibreOffice to compute plain cells with. ${advice}`);
  return paths[0];
}
