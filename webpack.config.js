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

/** A page is written by hand: its HTML is copied as it stands, its script and style are bundled. */
const html = (path) => new CopyPlugin({ patterns: [{ from: at(path), to: "[name][ext]" }] });

export default (env = {}) => {
  const origin = (env.origin ?? "https://localhost:3000").replace(/\/+$/, "");
  const bundle = (name, entry, ...plugins) => {
    const base = common(origin);
    return { ...base, name, entry: { [name]: at(entry) }, plugins: [...base.plugins, ...plugins] };
  };
  const styled = (name, folder) =>
    bundle(
      name,
      `${folder}/index.ts`,
      new MiniCssExtractPlugin({ filename: "[name].css" }),
      html(`${folder}/${name}.html`),
    );
  return [
    bundle("functions", "functions/register.ts", new FunctionsJsonPlugin({ files: frontDoors, origin })),
    styled("taskpane", "taskpane"),
    styled("trial", "taskpane/trial"),
  ].filter(({ entry }) => Object.values(entry).every((file) => existsSync(file)));
};
