import * as checks from "./checks/functions";
import * as edge from "./edge/functions";
import * as electrons from "./electrons/functions";
import * as helpers from "./helpers/functions";
import * as ionMix from "./ion-mix/functions";
import * as layer from "./layer/functions";
import * as magnetised from "./magnetised/functions";
import * as negativeIons from "./negative-ions/functions";
import * as probe from "./probe/functions";
import * as rf from "./rf/functions";
import * as wall from "./wall/functions";

export type FrontDoor = (...cells: any[]) => any[][];

/** Every custom function by its name. The enums that stand beside them in their files are left out. */
export const frontDoors: Readonly<Record<string, FrontDoor>> = Object.fromEntries(
  [edge, wall, layer, rf, negativeIons, ionMix, electrons, magnetised, probe, checks, helpers]
    .flatMap((family) => Object.entries(family) as [string, unknown][])
    .filter((named): named is [string, FrontDoor] => typeof named[1] === "function"),
);
