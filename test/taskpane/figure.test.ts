// @vitest-environment jsdom
import { expect, test } from "vitest";
import { entryNamed } from "../../functions/catalogue";
import { figureOf } from "../../taskpane/pane/figure-of";

const figure = (name: string, ...args: unknown[]) =>
  figureOf(
    entryNamed(name)!,
    args.map((arg) => [[arg]]),
  );

/** Start and end of the field line in the drawing. */
function fieldLine(drawing: SVGElement): [number, number][] {
  const d = drawing.querySelector(".trace")!.getAttribute("d")!;
  return [...d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);
}

test.each([1, 5, 30, 60, 90])("a field line at %d° is drawn at that angle from the face of the wall", (angle) => {
  const { drawing, words } = figure("MAGNETICPRESHEATHDROP", 20, angle)!;
  const [[x1, y1], [x2, y2]] = fieldLine(drawing);
  expect((Math.atan2(x2 - x1, y2 - y1) * 180) / Math.PI).toBeCloseTo(angle, 1);
  expect(words).toContain(`${angle}°`);
});

test("the words tell the angle from the face and from the normal", () => {
  expect(figure("MAGNETICPRESHEATHWIDTH", 20, "D+", 2, 5, 20)!.words).toBe(
    "The field line meets the wall at 5° from its face, which is 85° from its normal.",
  );
  expect(figure("WALLFLUX", 1e17, 3, "Ar+", null, null, 90)!.words).toMatch(/head-on/);
});

// S12: deuterium with T_i = T_e grazes at 3.354°.
test("the grazing limit draws its own result", () => {
  expect(figure("GRAZINGLIMIT", "D+", 20, 20)!.words).toMatch(/3\.354°/);
});

test("without an angle, with one that is refused, or for another function there is no figure", () => {
  expect(figure("WALLFLUX", 1e17, 3, "Ar+")).toBeUndefined();
  expect(figure("MAGNETICPRESHEATHDROP", 20, 120)).toBeUndefined();
  expect(figure("DEBYELENGTH", 1e16, 3)).toBeUndefined();
});
