import { execFile } from "node:child_process";
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { promisify } from "node:util";

/** Files as LibreOffice saves them after it opened them, by the same names. */
export async function savedByLibreOffice(
  soffice: string,
  files: Record<string, Uint8Array>,
): Promise<Record<string, Uint8Array>> {
  const folder = mkdtempSync(join(tmpdir(), "workbooks-"));
  try {
    const saved = join(folder, "saved");
    mkdirSync(saved);
    const names = Object.keys(files);
    for (const name of names) writeFileSync(join(folder, name), files[name]);
    const profile = `-env:UserInstallation=${pathToFileURL(join(folder, "profile")).href}`;
    const given = names.map((name) => join(folder, name));
    const args = [profile, "--headless", "--convert-to", "xlsx", "--outdir", saved, ...given];
    await promisify(execFile)(soffice, args, { timeout: 200_000 });
    return Object.fromEntries(names.map((name) => [name, new Uint8Array(readFileSync(join(saved, name)))]));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
