/** The part of UnitMath that units.ts uses; the package's own types describe another version. */
declare module "unitmath/src/Unit.js" {
  interface MathUnit {
    dimension: number[];
    getNormalizedValue(): number;
  }
  type UnitFactory = (value: number, text: string) => MathUnit;
  const unitmath: { config(options: { definitions: unknown }): UnitFactory };
  export default unitmath;
}
