import { existsSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

/** A file of the build that npm test makes first. */
export function built(name: string): string {
  return fileURLToPath(new URL(`../../dist/${name}`, import.meta.url));
}

export function readBuilt(name: string): string {
  if (!existsSync(built(name))) throw new Error(`dist/${name} is not there; run npm run build.`);
  return readFileSync(built(name), "utf8");
}
