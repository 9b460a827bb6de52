import { format } from "../../functions/cells/format";
import { isCellError } from "../../functions/cells/host";

/** The content of a cell in a few words. */
export function said(cell: unknown, digits = 6): string {
  if (cell === null || cell === undefined || cell === "") return "nothing";
  if (typeof cell === "number") return format(cell, digits);
  if (typeof cell === "boolean") return cell ? "TRUE" : "FALSE";
  if (isCellError(cell)) return (cell as { code: string }).code;
  const text = String(cell);
  return `"${text.length > 60 ? `${text.slice(0, 59)}…` : text}"`;
}

/** Two numbers with so many digits that they read differently. */
export function saidApart(a: unknown, b: unknown): [string, string] {
  for (let digits = 6; digits < 17; digits += 3) {
    const [x, y] = [said(a, digits), said(b, digits)];
    if (x !== y) return [x, y];
  }
  return [said(a, 17), said(b, 17)];
}
