import type { Mm, Rad } from "../core/units";
import { mm } from "../core/units";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";

/** Where sheet and punch stand in the middle plane of a stroke, from the machine's frame (die top at y = 0, punch on x = 0). */
export interface StrokePlacement {
  /** Punch travel from where it touches the flat sheet. */
  readonly depth: Mm;
  /** Height of the punch's tip, on the inside of the bend. */
  readonly tipHeight: Mm;
  /** Tangent point of the back wing's outside surface; the front wing's is its mirror image in x = 0. */
  readonly tangent: readonly [Mm, Mm];
  /** Half the angle turned through: the slope of each wing. */
  readonly slope: Rad;
}

/**
 * Air bending, symmetrical: the zone keeps its neutral length, so its inside radius at the angle a is allowance / a - k t;
 * both wings are tangent to the zone's arc and to the die's shoulder circles (radius rd, centres c = vOpening / 2 off the
 * middle, tops on the die's top plane). Then depth = c tan(a/2) - (R + t + rd)(1 / cos(a/2) - 1), from 0 when flat.
 * Written in 1 - cos over the angle, so that it holds at a = 0.
 */
export function strokePlacement(bend: Bend, thickness: Mm, die: Die, strokeAngle: Rad): StrokePlacement {
  const h = strokeAngle / 2;
  const neutral = bend.allowance / 2;
  const outer = (1 - bend.k) * thickness;
  const rise = h < 1e-9 ? h / 2 : (2 * Math.sin(h / 2) ** 2) / h;
  const chord = h < 1e-9 ? 1 : Math.sin(h) / h;
  const sag = neutral * rise + outer * (1 - Math.cos(h));
  const bulge = sag / Math.cos(h) + die.shoulderRadius * (1 / Math.cos(h) - 1);
  const depth = (die.vOpening / 2) * Math.tan(h) - bulge;
  return {
    depth: mm(depth),
    tipHeight: mm(thickness - depth),
    tangent: [mm(neutral * chord + outer * Math.sin(h)), mm(sag - depth)],
    slope: h as Rad,
  };
}
