/**
 * What an engineer would write by hand for one closed form over nested arrays as the host hands them over: no checks, no
 * units, the ion a constant, every argument that the example leaves out left out. The yardstick for what cells cost.
 */
import { edge } from "./edge";
import { layer } from "./layer";
import { magnetised } from "./magnetised";
import { negativeIons } from "./negative-ions";
import { probe } from "./probe";
import { rf } from "./rf";
import { wall } from "./wall";

/** By function, of one column for each number of its entry's example, in order. */
export const handLoops = { ...edge, ...wall, ...layer, ...rf, ...negativeIons, ...magnetised, ...probe };
