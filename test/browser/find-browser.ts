import { existsSync } from "node:fs";
import { chromium, type LaunchOptions } from "playwright-core";
import { installFromDebian } from "../debian";

const paths = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];
const channels = ["chrome", "msedge"];

/** As root there is no sandbox; and a browser under test has nothing to fetch for itself. */
const args = [
  ...(process.getuid?.() === 0 ? ["--no-sandbox"] : []),
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

/** How to launch a browser of this machine: the one that CHROMIUM_PATH names, else one that is there, else Debian's. */
export async function findBrowser(): Promise<LaunchOptions> {
  const named = process.env.CHROMIUM_PATH;
  if (named && !existsSync(named)) throw new Error(`CHROMIUM_PATH is ${named}, and there is no such file.`);
  const executablePath = named || paths.find(existsSync);
  if (executablePath) return { executablePath, args };
  for (const channel of channels) {
    if (await launches({ channel, args })) return { channel, args };
  }
  return { executablePath: debianChromium(), args };
}

async function launches(options: LaunchOptions): Promise<boolean> {
  try {
    await (await chromium.launch(options)).close();
    return true;
  } catch {
    return false;
  }
}

/** Debian's own package, where this process may install one. */
function debianChromium(): string {
  const advice = "Install Chromium, Chrome or Edge, or set CHROMIUM_PATH to the program.";
  installFromDebian(["chromium"], `The browser tests found no browser. ${advice}`);
  return "/usr/bin/chromium";
}
