import { execFileSync } from "node:child_process";
import { existsSync } from "node:fs";
import { chromium, type Browser, type BrowserContextOptions, type Page } from "playwright-core";
import { afterAll, inject, onTestFinished } from "vitest";

const paths = [
  process.env.CHROMIUM_PATH ?? "",
  "/usr/bin/chromium",
  "/usr/bin/chromium-browser",
  "/usr/bin/google-chrome",
];
const channels = ["chrome", "msedge"];

/** As root there is no sandbox; and a browser under test has nothing to fetch for itself. */
const args = [
  ...(process.getuid?.() === 0 ? ["--no-sandbox"] : []),
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

let launched: Promise<Browser> | undefined;

/** One browser for all tests of a file. */
export function browser(): Promise<Browser> {
  return (launched ??= launch());
}

afterAll(async () => (await launched)?.close());

async function launch(): Promise<Browser> {
  const executablePath = installed();
  if (executablePath) return chromium.launch({ executablePath, args });
  for (const channel of channels) {
    const found = await chromium.launch({ channel, args }).catch(() => undefined);
    if (found) return found;
  }
  return chromium.launch({ executablePath: debianChromium(), args });
}

function installed(): string | undefined {
  const named = process.env.CHROMIUM_PATH;
  if (named && !existsSync(named)) throw new Error(`CHROMIUM_PATH is ${named}, and there is no such file.`);
  return paths.find((path) => path !== "" && existsSync(path));
}

/** Debian's own package, where this process may install one. */
function debianChromium(): string {
  try {
    if (process.getuid?.() !== 0) throw new Error("only root may install packages");
    execFileSync("apt-get", ["update"], { stdio: "ignore" });
    execFileSync("apt-get", ["install", "-y", "--no-install-recommends", "chromium"], {
      stdio: "ignore",
      env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
    });
    return "/usr/bin/chromium";
  } catch (cause) {
    const advice = "Install Chromium, Chrome or Edge, or set CHROMIUM_PATH to the program.";
    throw new Error(`The browser tests found no browser. ${advice}`, { cause });
  }
}

/**
 * A page of the build, open for one test. The test fails on an error in the console, an uncaught error, a breach of the
 * policy, or any request that leaves the origin.
 */
export async function openPage(path: string, options: BrowserContextOptions = {}): Promise<Page> {
  const origin = inject("origin");
  const context = await (await browser()).newContext(options);
  const complaints: string[] = [];
  context.on("console", (message) => {
    if (message.type() === "error") complaints.push(`console: ${message.text()} (${message.location().url})`);
  });
  context.on("weberror", (error) => complaints.push(`uncaught: ${error.error().stack ?? error.error().message}`));
  context.on("request", (request) => {
    if (leaves(request.url(), origin)) complaints.push(`request to ${request.url()}`);
  });
  await context.exposeBinding("reportBreach", (_source, breach: string) => complaints.push(`policy: ${breach}`));
  await context.addInitScript(() =>
    addEventListener("securitypolicyviolation", ({ violatedDirective, blockedURI }) =>
      (window as unknown as { reportBreach(breach: string): void }).reportBreach(`${violatedDirective} ${blockedURI}`),
    ),
  );
  const page = await context.newPage();
  onTestFinished(async () => {
    await context.close();
    if (complaints.length > 0) throw new Error(`${path}:\n${complaints.join("\n")}`);
  });
  await page.goto(new URL(path, `${origin}/`).href);
  return page;
}

function leaves(address: string, origin: string): boolean {
  return !/^(data|blob|about):/.test(address) && new URL(address).origin !== origin;
}
