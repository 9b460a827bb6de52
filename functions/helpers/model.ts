import { k_B } from "../matter/constants";

/** A unit as an affine map to SI: SI value = scale · value + offset, and the dimension it has there. */
export interface AffineUnit {
  scale: number;
  offset: number;
  dimension: string;
}

/**
 * A value converted from one unit to another; undefined where the dimensions differ. Kelvin and joule stand for each
 * other through k_B, as plasma temperatures do; cycles and radians do not, because nothing says which was meant.
 */
export function convertUnit(
  value: number,
  from: AffineUnit,
  to: AffineUnit,
  kelvin: string,
  joule: string,
): number | undefined {
  const bridge =
    from.dimension === to.dimension
      ? 1
      : from.dimension === kelvin && to.dimension === joule
        ? k_B
        : from.dimension === joule && to.dimension === kelvin
          ? 1 / k_B
          : undefined;
  if (bridge === undefined) return undefined;
  if (from.offset === to.offset && bridge === 1) return value * (from.scale / to.scale);
  return ((from.scale * value + from.offset) * bridge - to.offset) / to.scale;
}
