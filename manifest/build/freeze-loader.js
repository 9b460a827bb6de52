/**
 * Runs a module at build time and ships its exported values as literals. For modules whose result is small and whose
 * making is not: atomic weights out of isotope tables, equations out of a TeX compiler.
 */
export default function freeze() {
  const done = this.async();
  this.importModule(`${this.resourcePath}?frozen`)
    .then((made) => {
      const lines = Object.entries(made).map(([name, value]) => `export const ${name} = ${JSON.stringify(value)};`);
      done(null, lines.join("\n"));
    })
    .catch(done);
}
