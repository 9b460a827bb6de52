import { tsImport } from "tsx/esm/api";

/** Emits the trial sheet's sample workbooks, made anew from their definitions in taskpane/trial/samples. */
export class SamplesPlugin {
  apply(compiler) {
    compiler.hooks.thisCompilation.tap("Samples", (compilation) => {
      compilation.hooks.processAssets.tapPromise("Samples", async () => {
        const { makeSamples } = await tsImport("../../taskpane/trial/samples/make.ts", import.meta.url);
        for (const [file, bytes] of Object.entries(makeSamples()))
          compilation.emitAsset(`samples/${file}`, new compiler.webpack.sources.RawSource(Buffer.from(bytes)));
      });
    });
  }
}
