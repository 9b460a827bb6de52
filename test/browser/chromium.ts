import { chromium, type Browser, type BrowserContextOptions, type Page } from "playwright-core";
import { afterAll, inject, onTestFinished } from "vitest";

let launched: Promise<Browser> | undefined;

/** One browser for all tests of a file. */
export function browser(): Promise<Browser> {
  return (launched ??= chromium.launch(inject("browser")));
}

afterAll(async () => (await launched)?.close());

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
