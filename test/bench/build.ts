import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import vm from "node:vm";

export type Front = (...cells: unknown[]) => unknown[][];

export const distFile = (name: string) => fileURLToPath(new URL(`../../dist/${name}`, import.meta.url));

/** The functions of dist/functions.js exactly as built, bound as the host binds them. */
export function builtFunctions(): Record<string, Front> {
  const doors: Record<string, Front> = {};
  (globalThis as { CustomFunctions?: unknown }).CustomFunctions = {
    associate: (id: string, door: Front) => (doors[id] = door),
  };
  vm.runInThisContext(readFileSync(distFile("functions.js"), "utf8"), { filename: "functions.js" });
  return doors;
}
