/**
 * The findings of saved workbooks, on the command line: npm run findings -- book.xlsx. Ends with 0 where there is
 * nothing open, 1 where there is, and 2 where a file cannot be looked through.
 */
import { readFileSync, statSync } from "node:fs";
import { basename, resolve } from "node:path";
import { fileWorkbook } from "../workbook/file";
import { FileProblem } from "../workbook/xlsx-book";
import { mostPacked, tooLarge } from "../workbook/xlsx-unpack";
import { lookThrough, openFindings } from "./look-through";
import { textReport } from "./text-report";

/** The build puts the version into what it makes; here it stands in the package. */
const { version } = JSON.parse(readFileSync(new URL("../../package.json", import.meta.url), "utf8")) as {
  version: string;
};

const files = process.argv.slice(2).filter((argument) => !argument.startsWith("-"));

if (files.length === 0) {
  console.error("Which workbook? npm run findings -- book.xlsx");
  process.exitCode = 2;
}
for (const file of files) process.exitCode = Math.max(Number(process.exitCode ?? 0), await findingsOf(file));

async function findingsOf(file: string): Promise<0 | 1 | 2> {
  try {
    const workbook = fileWorkbook(bytesOf(file));
    const found = await lookThrough(workbook, version, showProgress);
    console.log(textReport(basename(file), found));
    return openFindings(found).length > 0 ? 1 : 0;
  } catch (error) {
    console.error(`${file} cannot be looked through. ${whyNot(error)}`);
    return 2;
  }
}

/** The folder that npm was called in, which is not always the one it runs scripts in. */
function bytesOf(file: string): Uint8Array {
  const path = resolve(process.env.INIT_CWD ?? ".", file);
  const { size } = statSync(path);
  if (size > mostPacked) throw new FileProblem(tooLarge(size));
  return readFileSync(path);
}

function whyNot(error: unknown): string {
  const code = (error as { code?: string }).code;
  if (code === "ENOENT") return "There is no such file.";
  if (code === "EISDIR") return "It is a folder.";
  return error instanceof Error ? error.message : String(error);
}

/** Where somebody watches, in one line that goes away again. */
function showProgress(done: number): void {
  if (process.stderr.isTTY)
    process.stderr.write(done < 1 ? `\rLooking through: ${Math.floor(100 * done)} %` : "\r\u001b[K");
}
