import { expect, test } from "vitest";
import { numberText } from "../../taskpane/pane/number-text";

test.each([
  [1.28759652e-4, "1.287597 × 10⁻⁴"],
  [-23.829, "−23.829"],
  [1e7, "10⁷"],
  [-1e-7, "−10⁻⁷"],
  [1e16, "10¹⁶"],
  [0, "0"],
  [2691.8, "2691.8"],
  [0.001, "0.001"],
])("%d is shown as %s", (value, text) => expect(numberText(value)).toBe(text));
