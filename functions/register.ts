/** The entry point of functions.js: binds every front door to its id in functions.json. */
import { frontDoors } from "./front-doors";

declare const CustomFunctions: { associate(id: string, door: (...cells: unknown[]) => unknown[][]): void };

for (const [name, door] of Object.entries(frontDoors)) CustomFunctions.associate(name, door);
