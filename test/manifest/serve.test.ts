import { spawn, type ChildProcess } from "node:child_process";
import { createServer, type Server } from "node:net";
import { fileURLToPath } from "node:url";
import { afterEach, expect, test, vi } from "vitest";
import { readBuilt } from "./built";

const script = fileURLToPath(new URL("../../taskpane/trial/serve.js", import.meta.url));
const ending: (() => void)[] = [];

vi.setConfig({ testTimeout: 20_000 });

afterEach(() => ending.splice(0).forEach((end) => end()));

function start(...options: string[]): ChildProcess {
  const serving = spawn(process.execPath, [script, ...options], { stdio: ["ignore", "pipe", "pipe"] });
  ending.push(() => serving.kill());
  return serving;
}

/** What the server has printed once it has printed anything, and a moment to print more. */
async function printed(serving: ChildProcess): Promise<string> {
  let text = "";
  serving.stdout!.on("data", (part) => (text += part));
  serving.stderr!.on("data", (part) => (text += part));
  while (!text.includes("\n")) await pause(20);
  await pause(200);
  return text;
}

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

/** A port that something else has taken. */
async function takenPort(): Promise<number> {
  const other: Server = createServer();
  await new Promise<void>((resolve) => other.listen(0, "localhost", resolve));
  ending.push(() => other.close());
  return (other.address() as { port: number }).port;
}

test("the server prints one line with one address, and the trial sheet is there", async () => {
  const line = await printed(start("--port", "0"));
  expect(line).toMatch(/^http:\/\/localhost:\d+\/trial\.html\n$/);
  const response = await fetch(line.trim());
  expect(response.status).toBe(200);
  expect(await response.text()).toBe(readBuilt("trial.html"));
});

test("every file comes with the policy, and with the type that a browser wants", async () => {
  const origin = new URL(await printed(start("--port", "0"))).origin;
  const types = {
    "taskpane.html": "text/html;charset=utf-8",
    "taskpane.css": "text/css",
    "functions.js": "text/javascript",
    "functions.json": "application/json",
    "icon-32.png": "image/png",
    "manifest.xml": "text/xml",
  };
  for (const [file, type] of Object.entries(types)) {
    const { headers } = await fetch(`${origin}/${file}`);
    expect(headers.get("content-type"), file).toBe(type);
    expect(headers.get("content-security-policy"), file).toBe(readBuilt("policy.txt").trim());
  }
});

test("what is not in the build is not found, least of all outside it", async () => {
  const origin = new URL(await printed(start("--port", "0"))).origin;
  for (const path of ["nothing.js", "..%2fpackage.json", "%2e%2e/package.json"]) {
    expect((await fetch(`${origin}/${path}`)).status, path).toBe(404);
  }
});

test("where the port is taken the trial sheet moves to another", async () => {
  const port = await takenPort();
  const line = await printed(start("--port", `${port}`));
  expect(Number(new URL(line).port)).toBeGreaterThan(port);
});

test("a port that is none is refused with what to give instead", async () => {
  expect(await printed(start("--port", "abc"))).toBe('port "abc": give a whole number from 0 to 65535, such as 3000\n');
});
