import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { fileURLToPath } from "node:url";
import { initWasm, Resvg } from "@resvg/resvg-wasm";

export const iconSizes = [16, 32, 64, 80, 128];

const drawing = fileURLToPath(new URL("../icons/wallfall.svg", import.meta.url));
const renderer = createRequire(import.meta.url).resolve("@resvg/resvg-wasm/index_bg.wasm");
let ready;

/** The drawing as a PNG of `size` pixels square. */
export async function icon(size) {
  await (ready ??= initWasm(readFileSync(renderer)));
  const image = new Resvg(readFileSync(drawing, "utf8"), { fitTo: { mode: "width", value: size } }).render();
  return Buffer.from(image.asPng());
}

/** Emits icon-SIZE.png for every size the manifest names. */
export class IconsPlugin {
  apply(compiler) {
    compiler.hooks.thisCompilation.tap("Icons", (compilation) => {
      compilation.fileDependencies.add(drawing);
      compilation.hooks.processAssets.tapPromise("Icons", async () => {
        for (const size of iconSizes) {
          const png = new compiler.webpack.sources.RawSource(await icon(size));
          compilation.emitAsset(`icon-${size}.png`, png);
        }
      });
    });
  }
}
