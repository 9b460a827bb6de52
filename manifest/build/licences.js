import { existsSync, readdirSync, readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import satisfies from "spdx-satisfies";

const root = fileURLToPath(new URL("../../", import.meta.url));

/** Terms that ask for no more than a notice. For a font alone, OFL-1.1 is such a licence too. */
const permissive = [
  "MIT",
  "ISC",
  "BSD-2-Clause",
  "BSD-3-Clause",
  "Apache-2.0",
  "0BSD",
  "BlueOak-1.0.0",
  "CC0-1.0",
  "Unlicense",
  "Zlib",
  "OFL-1.1",
];

/** The host's library has terms of its own, which let an add-in pass it on unchanged; licences.txt holds them in full. */
const ownTerms = ["@microsoft/office-js"];

/** Runs in the build to join styles, and leaves nothing of itself in them. */
const buildOnly = /node_modules.css-loader./;

/** The packages that went into any bundle, collected from all of them and listed with their terms in licences.txt. */
export class Licences {
  #folders = new Set([join(root, "node_modules/@microsoft/office-js")]);

  /** A plugin that notes what goes into one bundle. */
  collector() {
    return {
      apply: (compiler) =>
        compiler.hooks.thisCompilation.tap("Licences", (compilation) =>
          compilation.hooks.afterSeal.tap("Licences", () => {
            for (const file of filesIn(compilation)) {
              const folder = packageOf(file);
              if (folder) this.#folders.add(folder);
            }
          }),
        ),
    };
  }

  /** A plugin that emits licences.txt, for a configuration that is built after the others; terms that are not permissive fail it. */
  lister() {
    return {
      apply: (compiler) =>
        compiler.hooks.thisCompilation.tap("Licences", (compilation) =>
          compilation.hooks.processAssets.tap("Licences", () => {
            const packages = [...this.#folders].map(terms).sort((a, b) => a.name.localeCompare(b.name));
            for (const { name, licence } of packages) {
              if (!isPermissive(name, licence))
                compilation.errors.push(new compiler.webpack.WebpackError(`${name} ships under "${licence}"`));
            }
            compilation.emitAsset("licences.txt", new compiler.webpack.sources.RawSource(listing(packages)));
          }),
        ),
    };
  }
}

/** Every file whose content ends up in the bundle: as code, as style or font, or as a value worked out by the build. */
function filesIn({ modules, chunkGraph, buildTimeExecutedModules }) {
  return [...modules]
    .filter((module) => chunkGraph.getNumberOfModuleChunks(module) > 0 || buildTimeExecutedModules.has(module))
    .flatMap((module) => [module, ...(module.modules ?? [])])
    .map((module) => module.nameForCondition?.())
    .filter((file) => file && !buildOnly.test(file));
}

/** The folder of the package that a file belongs to; undefined for our own. */
function packageOf(file) {
  if (!file.includes("node_modules")) return undefined;
  let folder = dirname(file);
  while (!isPackage(folder)) folder = dirname(folder);
  return folder;
}

/** Some packages keep a nameless package.json in a folder of theirs, to say how its modules are read. */
function isPackage(folder) {
  const file = join(folder, "package.json");
  return existsSync(file) && "version" in JSON.parse(readFileSync(file, "utf8"));
}

function terms(folder) {
  const { name, version, license } = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
  const files = readdirSync(folder).filter((file) => /^(licen[cs]e|notice|copying)/i.test(file));
  const text = files
    .sort()
    .map((file) => readFileSync(join(folder, file), "utf8").trim())
    .join("\n\n");
  return { name, version, licence: license ?? readOff(text), text };
}

/** One package of the grid forgets the field and brings the text. */
function readOff(text) {
  return /^\s*Apache License\s+Version 2\.0/.test(text) ? "Apache-2.0" : "none stated";
}

export function isPermissive(name, licence) {
  if (ownTerms.includes(name)) return true;
  try {
    return satisfies(licence, permissive);
  } catch {
    return false; // not an expression of the SPDX list
  }
}

/** Each text once, after the packages that it covers. */
function listing(packages) {
  const byText = new Map();
  for (const each of packages) byText.set(each.text, [...(byText.get(each.text) ?? []), each]);
  const own = `Wallfall ships under these terms:\n\n${readFileSync(join(root, "LICENSE"), "utf8").trim()}`;
  const others = [...byText].map(([text, covered]) => {
    const names = covered.map(({ name, version, licence }) => `${name} ${version} (${licence})`).join("\n");
    return `${names}\n\n${text || "The package states its licence and brings no text of it."}`;
  });
  return [own, ...others].join(`\n\n${"-".repeat(80)}\n\n`) + "\n";
}
