import { existsSync, readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import CopyPlugin from "copy-webpack-plugin";
import { EsbuildPlugin } from "esbuild-loader";
import MiniCssExtractPlugin from "mini-css-extract-plugin";
import { FunctionsJsonPlugin } from "./manifest/build/functions-json.js";
import webpack from "webpack";

const at = (path) => fileURLToPath(new URL(path, import.meta.url));
const { version } = JSON.parse(readFileSync(at("package.json"), "utf8"));

/** The front doors of all families, for functions.json. */
const frontDoors = () =>
  readdirSync(at("functions"))
    .map((family) => at(`functions/${family}/functions.ts`))
    .filter((file) => existsSync(file));

const freeze = at("manifest/build/freeze-loader.js");

/** Shared by all pages; each page is a configuration of its own, so that none leaks into another's bundle. */
const common = (origin) => ({
  mode: "production",
  devtool: false,
  performance: false,
  stats: "errors-warnings",
  output: { path: at("dist"), filename: "[name].js" },
  resolve: { extensions: [".ts", ".tsx", ".js"] },
  module: {
    rules: [
      { test: /\.tsx?$/, loader: "esbuild-loader", options: { target: "es2022" } },
      // Modules whose exports are worked out by the build, see the loader.
      { test: /atomic-weights\.ts$|equations\.ts$/, resourceQuery: { not: [/frozen/] }, loader: freeze },
      { test: /\.css$/, use: [MiniCssExtractPlugin.loader, "css-loader"] },
      { test: /\.woff2$/, type: "asset/resource", generator: { filename: "fonts/[name][ext]" } },
    ],
  },
  optimization: { minimizer: [new EsbuildPlugin({ target: "es2022", css: true })] },
  plugins: [
    new webpack.DefinePlugin({
      WALLFALL_VERSION: JSON.stringify(version),
      WALLFALL_BUILT: JSON.stringify(new Date().toISOString().slice(0, 10)),
      WALLFALL_ORIGIN: JSON.stringify(origin),
    }),
  ],
});

export default (env = {}) => {
  const origin = (env.origin ?? "https://localhost:3000").replace(/\/+$/, "");
  const page = (name, entry, ...plugins) => {
    const base = common(origin);
    return { ...base, name, entry: { [name]: entry }, plugins: [...base.plugins, ...plugins] };
  };
  return [page("functions", at("functions/register.ts"), new FunctionsJsonPlugin({ files: frontDoors, origin }))];
};

void CopyPlugin;
