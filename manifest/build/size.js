import { gzipSync } from "node:zlib";

/** Prints the gzipped size of one asset after each build, and warns when it is over what it may be. */
export class SizePlugin {
  constructor({ asset, limit }) {
    this.asset = asset;
    this.limit = limit;
  }

  apply(compiler) {
    compiler.hooks.thisCompilation.tap("Size", (compilation) => {
      const stage = compiler.webpack.Compilation.PROCESS_ASSETS_STAGE_REPORT;
      compilation.hooks.processAssets.tap({ name: "Size", stage }, (assets) => {
        const size = gzipSync(assets[this.asset].buffer(), { level: 9 }).length;
        const said = `${this.asset} is ${kilobytes(size)} gzipped, of at most ${kilobytes(this.limit)}`;
        if (size > this.limit) compilation.warnings.push(new compiler.webpack.WebpackError(said));
        else console.log(said);
      });
    });
  }
}

function kilobytes(bytes) {
  return `${(bytes / 1024).toFixed(1)} KB`;
}
