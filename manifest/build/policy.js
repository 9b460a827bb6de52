/**
 * What the pages may do, as the header a server sends: their own files and nothing else. Inline styles and data: images are
 * the trial sheet's grid's. Frames fall under the default, which also stops the host library's telemetry. No
 * frame-ancestors: a spreadsheet in the browser shows the pane in a frame.
 */
export const policy = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self' 'unsafe-inline'",
  "connect-src 'self'",
  "img-src 'self' data:",
  "font-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
].join("; ");

/** Emits the policy as policy.txt: the value of the header for whoever serves the build, our own server included. */
export class PolicyPlugin {
  constructor(value) {
    this.value = value;
  }

  apply(compiler) {
    compiler.hooks.thisCompilation.tap("Policy", (compilation) =>
      compilation.hooks.processAssets.tap("Policy", () =>
        compilation.emitAsset("policy.txt", new compiler.webpack.sources.RawSource(`${this.value}\n`)),
      ),
    );
  }
}
