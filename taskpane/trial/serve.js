import { existsSync, readFileSync } from "node:fs";
import { createServer } from "node:http";
import { createServer as createSecureServer } from "node:https";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { parseArgs } from "node:util";
import sirv from "sirv";
import { developmentCertificate } from "./certificate.js";

const dist = fileURLToPath(new URL("../../dist", import.meta.url));

/** Serves the built files on localhost. Port 0 takes any free one. */
export async function serve({ folder = dist, port = 0, tls } = {}) {
  const server = tls ? createSecureServer(tls, files(folder)) : createServer(files(folder));
  await listen(server, port);
  return { server, origin: `${tls ? "https" : "http"}://localhost:${server.address().port}` };
}

/** The policy that the build wrote, with every file; the host reads functions.json from another origin. */
function files(folder) {
  const policyFile = join(folder, "policy.txt");
  if (!existsSync(policyFile)) throw new Error("nothing is built yet; run npm run build");
  const policy = readFileSync(policyFile, "utf8").trim();
  const setHeaders = (response) => {
    response.setHeader("Content-Security-Policy", policy);
    response.setHeader("X-Content-Type-Options", "nosniff");
    response.setHeader("Access-Control-Allow-Origin", "*");
  };
  return sirv(folder, { dev: true, etag: true, setHeaders });
}

function listen(server, port) {
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "localhost", () => {
      server.off("error", reject);
      resolve();
    });
  });
}

/** The trial sheet moves on to the next port where one is taken: nothing but its own page knows the number. */
async function serveOnFreePort(wanted) {
  for (let port = wanted; ; port++) {
    try {
      return await serve({ port });
    } catch (error) {
      if (error.code !== "EADDRINUSE" || port === wanted + 50) throw error;
    }
  }
}

/** The add-in stays on the port that its manifest names. */
async function serveSecurely(port) {
  const { advice, ...tls } = await developmentCertificate();
  const { origin } = await serve({ port, tls });
  console.log(`Serving the add-in at ${origin}`);
  if (advice) console.log(advice);
  if (origin !== "https://localhost:3000")
    console.log(`The manifest must name it: npm run build -- --env origin=${origin}`);
  console.log("Now give dist/manifest.xml to the spreadsheet; README.md says how, on the web, Windows and Mac.");
}

function readPort(text) {
  const port = Number(text);
  if (Number.isInteger(port) && port >= 0 && port < 65536) return port;
  throw new Error(`port "${text}": give a whole number from 0 to 65535, such as 3000`);
}

async function main() {
  const { values } = parseArgs({ options: { port: { type: "string" }, https: { type: "boolean" } } });
  const port = readPort(values.port ?? process.env.PORT ?? "3000");
  if (values.https) return serveSecurely(port);
  const { origin } = await serveOnFreePort(port);
  console.log(`${origin}/trial.html`);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  main().catch((error) => {
    const taken = error.code === "EADDRINUSE" ? "; free it, or choose another with --port" : "";
    console.error(`${error.message}${taken}`);
    process.exitCode = 1;
  });
}
