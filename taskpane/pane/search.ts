import type { Words } from "./words";

/** What the search looks through for one function. */
export interface Searchable {
  name: string;
  family: string;
  words: Words | undefined;
}

/** The functions in which every word of the query is found, best first: names before inputs before meanings. */
export function search<T extends Searchable>(functions: readonly T[], query: string): T[] {
  const wanted = query
    .toLowerCase()
    .replace(/^=?\s*sheath\./, "")
    .split(/\s+/)
    .filter((word) => word !== "");
  const scored = functions.map((each) => ({ each, score: scoreOf(each, wanted) }));
  return scored
    .filter(({ score }) => score > 0)
    .sort((a, b) => b.score - a.score)
    .map(({ each }) => each);
}

/** 0 where some word is not found at all. */
function scoreOf({ name, family, words }: Searchable, wanted: readonly string[]): number {
  let total = 1;
  for (const word of wanted) {
    const score = Math.max(
      places(name, word, 100, 60, 30),
      ...(words?.parameters ?? []).map((parameter) =>
        Math.max(places(parameter.name, word, 25, 15, 6), places(parameter.meaning, word, 4, 4, 2)),
      ),
      places(words?.meaning ?? "", word, 12, 10, 5),
      places(family, word, 3, 3, 1),
    );
    if (score === 0) return 0;
    total += score;
  }
  return total;
}

/** A score by how the word stands in the text: the whole of it, at the start of one of its words, or inside. */
function places(text: string, word: string, whole: number, start: number, inside: number): number {
  const lower = text.toLowerCase();
  if (lower === word) return whole;
  if (lower.startsWith(word) || lower.split(/[^\p{L}\p{N}_]+/u).some((each) => each.startsWith(word))) return start;
  return lower.includes(word) ? inside : 0;
}
