import { createRequire } from "node:module";

const { generateCustomFunctionsMetadata } = createRequire(import.meta.url)("custom-functions-metadata");

/**
 * functions.json from the JSDoc of the front doors. The generator can't write allowErrorForDataTypeAny, which keeps one
 * error cell in a range from killing the whole call, nor does it notice a name used twice: both happen here.
 */
export async function functionsJson(files, origin) {
  const made = await generateCustomFunctionsMetadata(files, false);
  if (made.errors?.length) throw new Error(made.errors.join("\n"));
  const metadata = typeof made.metadataJson === "string" ? JSON.parse(made.metadataJson) : made;
  const ids = metadata.functions.map(({ id }) => id);
  const twice = ids.filter((id, i) => ids.indexOf(id) !== i);
  if (twice.length > 0) throw new Error(`functions.json: declared twice: ${twice.join(", ")}`);
  for (const declared of metadata.functions) {
    // The formula bar shows one line; the source breaks its lines where the page ends.
    declared.description = declared.description.replace(/\s+/g, " ");
    for (const parameter of declared.parameters) parameter.description = parameter.description.replace(/\s+/g, " ");
    if (declared.helpUrl) declared.helpUrl = declared.helpUrl.replace("https://localhost:3000", origin);
  }
  return { ...metadata, allowErrorForDataTypeAny: true };
}

/** Emits functions.json beside functions.js, and makes webpack watch the files it came from. */
export class FunctionsJsonPlugin {
  constructor({ files, origin }) {
    this.files = files;
    this.origin = origin;
  }

  apply(compiler) {
    compiler.hooks.thisCompilation.tap("FunctionsJson", (compilation) => {
      compilation.hooks.processAssets.tapPromise("FunctionsJson", async () => {
        const json = JSON.stringify(await functionsJson(this.files(), this.origin), null, 1);
        compilation.emitAsset("functions.json", new compiler.webpack.sources.RawSource(json));
        this.files().forEach((file) => compilation.fileDependencies.add(file));
      });
    });
  }
}
