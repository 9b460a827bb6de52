import { execFileSync } from "node:child_process";

/** Debian's own packages, where this process may install them; where not, the advice says what is missing. */
export function installFromDebian(packages: readonly string[], advice: string): void {
  try {
    if (process.getuid?.() !== 0) throw new Error("Only root may install packages.");
    const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
    execFileSync("apt-get", ["update"], { stdio: "ignore", env });
    execFileSync("apt-get", ["install", "-y", "--no-install-recommends", ...packages], { stdio: "ignore", env });
  } catch (cause) {
    throw new Error(advice, { cause });
  }
}
