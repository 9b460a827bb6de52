import { existsSync, readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import CopyPlugin from "copy-webpack-plugin";
import { EsbuildPlugin } from "esbuild-loader";
import MiniCssExtractPlugin from "mini-css-extract-plugin";
import webpack from "webpack";
import { FunctionsJsonPlugin } from "./manifest/build/functions-json.js";
import { allowVendor, fromVendor, hostLibrary, readOffice } from "./manifest/build/host-library.js";
import { IconsPlugin } from "./manifest/build/icons.js";
import { Licences } from "./manifest/build/licences.js";
import { policy, PolicyPlugin } from "./manifest/build/policy.js";
import { SamplesPlugin } from "./manifest/build/samples.js";
import { SizePlugin } from "./manifest/build/size.js";
import { ManifestPlugin, readOrigin } from "./manifest/build/stamp.js";

const at = (path) => fileURLToPath(new URL(path, import.meta.url));
const { version } = JSON.parse(readFileSync(at("package.json"), "utf8"));

/** The front doors of all families, for functions.json. */
const frontDoors = () =>
  readdirSync(at("functions"))
    .map((family) => at(`functions/${family}/functions.ts`))
    .filter((file) => existsSync(file));

const freeze = at("manifest/build/freeze-loader.js");
const forFunctions = ["leave-out-loader.js", "loop-loader.js"].map((name) => at(`manifest/build/${name}`));

/** Shared by all bundles; each is a configuration of its own, so that none leaks into another. */
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
      { test: /[\\/](atomic-weights|equations)\.ts$/, resourceQuery: { not: [/frozen/] }, loader: freeze },
      { test: /\.css$/, use: [MiniCssExtractPlugin.loader, "css-loader"] },
      { test: /\.woff2$/, type: "asset/resource", generator: { filename: "fonts/[name][ext]" } },
    ],
  },
  optimization: { minimizer: [new EsbuildPlugin({ target: "es2022", css: true })] },
  plugins: [
    // UnitMath's table of units, which ours replaces, is a quarter of the library.
    new webpack.NormalModuleReplacementPlugin(/BuiltIns\.js$/, at("functions/cells/no-built-in-units.js")),
    new webpack.DefinePlugin({
      WALLFALL_VERSION: JSON.stringify(version),
      WALLFALL_BUILT: JSON.stringify(new Date().toISOString().slice(0, 10)),
      WALLFALL_ORIGIN: JSON.stringify(origin),
    }),
  ],
});

/** The trial sheet's grid comes with hyphenation for seventy languages (5 MB), of which it only ever loads British English. */
const noHyphenation = new webpack.IgnorePlugin({
  resourceRegExp: /^\.\/(?!en-gb)[\w-]+\.js$/,
  contextRegExp: /@univerjs[\\/]engine-render[\\/]lib[\\/]es$/,
});

/**
 * Options, each as --env NAME=VALUE: `origin` the address the files will be served under, `office` "hosted" to take the
 * host's library from its vendor instead of from the build, `id` and `name` for an organisation's own copy.
 */
export default (env = {}) => {
  const origin = readOrigin(env.origin);
  const hosted = readOffice(env.office) === "hosted";
  const licences = new Licences();

  const bundle = (name, entry, ...plugins) => {
    const base = common(origin);
    return {
      ...base,
      name,
      entry: { [name]: at(entry) },
      output: { ...base.output, chunkFilename: `${name}/[id].js` },
      plugins: [...base.plugins, licences.collector(), ...plugins],
    };
  };
  const styled = (name, folder, ...plugins) =>
    bundle(name, `${folder}/index.ts`, new MiniCssExtractPlugin({ filename: "[name].css" }), ...plugins);
  const functions = bundle(
    "functions",
    "functions/register.ts",
    new FunctionsJsonPlugin({ files: frontDoors, origin }),
    new SizePlugin({ asset: "functions.js", limit: 60 * 1024 }),
  );
  functions.module.rules.push({ test: /[\\/]functions[\\/].*\.ts$/, enforce: "pre", use: forFunctions });
  const bundles = [functions, styled("taskpane", "taskpane"), styled("trial", "taskpane/trial", noHyphenation)].filter(
    ({ entry }) => Object.values(entry).every((file) => existsSync(file)),
  );

  /** Pages are written by hand and copied as they stand. */
  const page = (from, transform) => ({ from: at(from), to: "[name][ext]", transform });
  const hostPage = hosted ? (html) => fromVendor(html.toString()) : undefined;
  const site = {
    ...common(origin),
    name: "site",
    entry: {},
    dependencies: bundles.map(({ name }) => name),
    plugins: [
      new CopyPlugin({
        patterns: [
          page("manifest/functions.html", hostPage),
          page("taskpane/taskpane.html", hostPage),
          page("taskpane/trial/trial.html"),
          ...hostLibrary(hosted),
        ],
      }),
      new IconsPlugin(),
      new SamplesPlugin(),
      new ManifestPlugin({ origin, version, id: env.id, name: env.name }),
      new PolicyPlugin(hosted ? allowVendor(policy) : policy),
      licences.lister(),
    ],
  };
  return [...bundles, site];
};
