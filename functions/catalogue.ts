import type { Entry, Family } from "./cells/entry";
import { checksOver } from "./checks/entries";
import { edge } from "./edge/entries";
import { electrons } from "./electrons/entries";
import { helpers } from "./helpers/entries";
import { ionMix } from "./ion-mix/entries";
import { layer } from "./layer/entries";
import { magnetised } from "./magnetised/entries";
import { negativeIons } from "./negative-ions/entries";
import { probe } from "./probe/entries";
import { rf } from "./rf/entries";
import { wall } from "./wall/entries";

/** The checks find every function by its entry, those added later too. */
export const checks = checksOver({ named: entryNamed, all: () => catalogue });

/** All families in the catalogue's order: what the pane, the check functions and the tests iterate over. */
export const families: readonly Family[] = [
  edge,
  wall,
  layer,
  rf,
  negativeIons,
  ionMix,
  electrons,
  magnetised,
  probe,
  checks.family,
  helpers,
];

export const catalogue: readonly Entry[] = families.flatMap((family) => family.entries);

/** The entry of a function by its name in any case, with or without the namespace. */
export function entryNamed(name: string): Entry | undefined {
  const wanted = name
    .trim()
    .replace(/^SHEATH\./i, "")
    .toUpperCase();
  return catalogue.find((entry) => entry.name === wanted);
}
