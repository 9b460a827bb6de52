/** The prose of a function: it stands in the JSDoc of its front door and reaches the pane through functions.json. */
export interface Words {
  meaning: string;
  parameters: { name: string; meaning: string; optional: boolean; repeating: boolean }[];
}

/** The part of functions.json that the pane reads. */
interface Declared {
  functions: {
    name: string;
    description?: string;
    parameters: { name: string; description?: string; optional?: boolean; repeating?: boolean }[];
  }[];
}

export async function loadWords(): Promise<Map<string, Words>> {
  const answer = await fetch(new URL("functions.json", document.baseURI));
  if (!answer.ok) throw new Error(`functions.json: ${answer.status} ${answer.statusText}`);
  return wordsIn(await answer.json());
}

export function wordsIn({ functions }: Declared): Map<string, Words> {
  return new Map(
    functions.map(({ name, description = "", parameters }) => [
      name,
      {
        meaning: description,
        parameters: parameters.map(({ name, description = "", optional = false, repeating = false }) => ({
          name,
          meaning: description,
          optional,
          repeating,
        })),
      },
    ]),
  );
}

/** The first sentence, for the list; a dot inside a number or a symbol ends nothing. */
export function firstSentence(text: string): string {
  return /^.*?\.(?=\s|$)/s.exec(text)?.[0] ?? text;
}
