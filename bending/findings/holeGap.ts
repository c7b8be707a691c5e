import type { Vec2 } from "../geometry/vec2";
import type { Bend } from "../part/partModel";
import { zoneGap, type ZoneGap } from "./zoneGap";

interface HoleShape {
  readonly outline: readonly Vec2[];
  readonly circle: { readonly centre: Vec2; readonly radius: number } | null;
}

/** `zoneGap` of a hole; a round one exactly, not by the chords that stand for it. */
export function holeGap({ outline, circle }: HoleShape, bend: Bend): ZoneGap {
  if (!circle) return zoneGap(outline, bend);
  const { centre, radius } = circle;
  const { gap, into, away, from } = zoneGap([centre], bend);
  const meets = gap < radius;
  const depth = (centre[0] - from[0]) * away[0] + (centre[1] - from[1]) * away[1];
  const share = gap > 0 ? radius / gap : 0;
  const to: Vec2 = [centre[0] + (from[0] - centre[0]) * share, centre[1] + (from[1] - centre[1]) * share];
  return { gap: Math.max(0, gap - radius), into: meets ? (into > 0 ? into : -depth) + radius : 0, away, from, to };
}
