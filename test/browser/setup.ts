import { spawn } from "node:child_process";
import { fileURLToPath } from "node:url";
import type { LaunchOptions } from "playwright-core";
import type { TestProject } from "vitest/node";
import { findBrowser } from "./find-browser";

declare module "vitest" {
  interface ProvidedContext {
    /** Where the built pages are served while the browser tests run. */
    origin: string;
    browser: LaunchOptions;
  }
}

const server = fileURLToPath(new URL("../../taskpane/trial/serve.js", import.meta.url));

/** Serves dist/ as npm start does, on a free port; what is built there is what is tested. No browser, no tests: it throws. */
export default async function setup(project: TestProject) {
  project.provide("browser", await findBrowser());
  const serving = spawn(process.execPath, [server, "--port", "0"], { stdio: ["ignore", "pipe", "inherit"] });
  const address = await new Promise<string>((resolve, reject) => {
    serving.stdout.once("data", (line: Buffer) => resolve(line.toString().trim()));
    serving.once("exit", () =>
      reject(new Error("The server of the built pages ended at once, see its message above.")),
    );
  });
  project.provide("origin", new URL(address).origin);
  return () => void serving.kill();
}
