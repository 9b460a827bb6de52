import { expect, test } from "vitest";
import { isCellError } from "../../functions/cells/host";
import { frontDoors } from "../../functions/front-doors";
import { entryNamed } from "../../functions/catalogue";

test("a point so small that its neighbour's ratio to it overflows ends in an answer, not in an endless loop", () => {
  const [energy, eepf] = entryNamed("EEPFFLOATING")!.example as number[][][];
  const tiny = eepf.map(([F], i) => [i === 0 ? 1e-320 : F]);
  const [[cell]] = frontDoors.EEPFFLOATING(energy, tiny, [["Ar+"]]);
  expect(typeof cell === "number" || (isCellError(cell) && cell.message !== "")).toBe(true);
});
