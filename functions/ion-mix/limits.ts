import type { Limit } from "../cells/entry";
import { BHC09 } from "../sources";
import { Fault } from "../cells/fault";
import type { MixRule, Share } from "./model";

/**
 * Which rule suits the mixture. Ions of comparable densities excite the ion–ion two-stream instability in the presheath,
 * whose friction brings them to a common speed; a minority is too thin for it, and each leaves at its own Bohm speed.
 */
export function ruleSuitsMixture(
  of: (...values: any[]) => [mix: readonly Share[] | Fault, rule: MixRule],
): readonly Limit[] {
  const minority =
    (wanted: MixRule): Limit["value"] =>
    (...values) => {
      const [mix, rule] = of(...values);
      return rule !== wanted || mix instanceof Fault || mix.length < 2 ? undefined : minorityCharge(mix);
    };
  const measure = "charge of all but the main ion";
  return [
    {
      assumption: "the ions drag each other to a common speed",
      measure,
      value: minority("common"),
      holds: 0.1,
      fails: 0.01,
      reason: 'so small a minority leaves at its own Bohm speed; take rule "own"',
      source: BHC09,
    },
    {
      assumption: "each ion leaves at its own Bohm speed",
      measure,
      value: minority("own"),
      holds: 0.1,
      fails: 0.3,
      reason:
        'ions of comparable densities drag each other to a common speed; take rule "common" where T_e is far above T_i',
      source: BHC09,
    },
  ];
}

function minorityCharge(mix: readonly Share[]): number {
  let most = 0;
  for (const { ion, fraction } of mix) most = Math.max(most, ion.charge * fraction);
  return Math.max(0, 1 - most);
}
