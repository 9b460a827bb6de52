/** The README's list of functions, from the catalogue and the front doors' own words. */
import { readFileSync, writeFileSync } from "node:fs";
import { families } from "../functions/catalogue";
import { declarations } from "./declarations";

const start = "<!-- functions: written by `npm run readme` -->\n";
const end = "<!-- /functions -->";

export async function functionTable(): Promise<string> {
  const declared = await declarations();
  const rows = families.flatMap(({ title, entries }) => [
    `**${title}**\n`,
    ...entries.map(({ name }) => {
      const { description, parameters } = declared.get(name)!;
      const list = parameters.map((each) => (each.optional ? `[${each.name}]` : each.name)).join(", ");
      return `- \`${name}(${list})\` ${description}`;
    }),
    "",
  ]);
  return `\n${rows.join("\n")}\n`;
}

export function readmeTable(readme: string): string {
  return readme.slice(readme.indexOf(start) + start.length, readme.indexOf(end));
}

if (process.argv[2] === "write") {
  const readme = readFileSync("README.md", "utf8");
  const from = readme.indexOf(start) + start.length;
  writeFileSync("README.md", readme.slice(0, from) + (await functionTable()) + readme.slice(readme.indexOf(end)));
}
