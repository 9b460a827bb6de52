import { randomUUID } from "node:crypto";
import { mkdtemp, readFile, rm, writeFile } from "node:fs/promises";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { DOMParser, XMLSerializer } from "@xmldom/xmldom";

const { OfficeAddinManifest } = createRequire(import.meta.url)("office-addin-manifest");

const source = fileURLToPath(new URL("../manifest.xml", import.meta.url));
const sourceOrigin = "https://localhost:3000";

/**
 * The manifest for files served under `origin`, at `version`. An organisation that serves a copy of its own gives it an id
 * and a name of its own too, since a spreadsheet tells add-ins apart by id alone.
 */
export async function stamp(xml, { origin, version, id, name }) {
  const page = new DOMParser({ onError: refuse }).parseFromString(xml, "text/xml");
  page.getElementsByTagName("Version")[0].textContent = fourPart(version);
  for (const element of page.getElementsByTagName("*")) {
    const address = element.getAttribute("DefaultValue") ?? "";
    if (address.startsWith(sourceOrigin))
      element.setAttribute("DefaultValue", origin + address.slice(sourceOrigin.length));
  }
  const own = page.getElementsByTagName("Id")[0].textContent;
  return renamed(new XMLSerializer().serializeToString(page), readId(id ?? own), name);
}

/** The same copy keeps its id from build to build, so it is given, not made up here. */
function readId(id) {
  if (/^[\da-f]{8}(-[\da-f]{4}){3}-[\da-f]{12}$/i.test(id)) return id;
  throw new Error(`--env id=${id}: give a UUID of your own, such as ${randomUUID()}`);
}

/** Id and name through the platform's own tool, which works on files alone. */
async function renamed(xml, id, name) {
  const folder = await mkdtemp(join(tmpdir(), "manifest-"));
  const file = join(folder, "manifest.xml");
  try {
    await writeFile(file, xml);
    await OfficeAddinManifest.modifyManifestFile(file, id, name);
    return await readFile(file, "utf8");
  } finally {
    await rm(folder, { recursive: true });
  }
}

/** 1.2.3 as the platform writes it, 1.2.3.0. */
function fourPart(version) {
  const numbers = /^(\d+)\.(\d+)\.(\d+)/.exec(version);
  if (!numbers) throw new Error(`version "${version}": the manifest takes numbers only, such as 1.2.3`);
  return `${numbers.slice(1).join(".")}.0`;
}

/** The address that the built files will be served under, without a slash at its end. */
export function readOrigin(text = sourceOrigin) {
  const address = URL.canParse(text) ? new URL(text) : undefined;
  if (address?.protocol !== "https:" || address.search || address.hash) {
    throw new Error(`--env origin=${text}: give an https address such as https://plasma.example.org/wallfall`);
  }
  return address.href.replace(/\/+$/, "");
}

function refuse(level, message) {
  throw new Error(`manifest.xml: ${level}: ${message}`);
}

/** Emits the stamped manifest.xml. */
export class ManifestPlugin {
  constructor(facts) {
    this.facts = facts;
  }

  apply(compiler) {
    compiler.hooks.thisCompilation.tap("Manifest", (compilation) => {
      compilation.fileDependencies.add(source);
      compilation.hooks.processAssets.tapPromise("Manifest", async () => {
        const xml = await stamp(await readFile(source, "utf8"), this.facts);
        compilation.emitAsset("manifest.xml", new compiler.webpack.sources.RawSource(xml));
      });
    });
  }
}
