import type { Mm, Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";
import { clipPrism, type Clipped } from "./clipPrism";
import type { Half } from "./half";
import { NO_MEETING, type Meeting } from "./meeting";
import type { Obstacle } from "./obstacle";
import { strokePlacement } from "./strokePlacement";
import { wingPose } from "./pose";

/** Plates that the zone being bent is cut into; they lie within the true zone, so a tool that only touches it is not met. */
const FACETS = 8;

/** The bend zone in the making (of the bends that part the hit from `half` at the back) against a tool that is not one of the two that make it: their contact is meant, this one's is not. */
export function meetOwnZone({ bend, thickness, lines }: Half, die: Die, obstacle: Obstacle, end: Rad, margin: Mm): Meeting {
  const steps = Math.max(8, Math.ceil((die.vOpening + bend.allowance) / margin));
  const found: Interval[] = [];
  let [first, depth] = [Infinity, 0];
  const clipped: Clipped = { separation: 0, from: 0, to: 0 };
  for (let sample = 0; sample <= steps; sample++) {
    const angle = ((end * sample) / steps) as Rad;
    const lift = obstacle.on === "ram" ? obstacle.lift : obstacle.lift - strokePlacement(bend, thickness, die, angle).tipHeight;
    for (const points of lines.flatMap((line) => zonePrisms(bend, thickness, angle / 2, line))) {
      for (const piece of obstacle.shape.pieces) {
        clipPrism(points, 4, piece.withoutSkin.planes, lift, clipped);
        if (clipped.separation > 0 || clipped.from > clipped.to) continue;
        found.push([clipped.from - margin, clipped.to + margin]);
        first = Math.min(first, angle);
        depth = Math.max(depth, -clipped.separation);
      }
    }
  }
  return found.length ? { intervals: mergeIntervals(found), strokeAngle: first, depth } : NO_MEETING;
}

/** Plates between chords of the outside arc and tangents of the inside arc, seen from the punch's tip. */
function zonePrisms(bend: Bend, thickness: Mm, h: number, line: Interval): readonly Float64Array[] {
  const half = h / FACETS;
  const inset = h < 1e-6 ? 0 : (bend.allowance / (2 * h) - bend.k * thickness) * (1 / Math.cos(half) - 1);
  const corner = (i: number): readonly [number, number, number, number] => {
    const turn = h * ((2 * i) / FACETS - 1);
    const size = Math.abs(turn);
    const sign = turn < 0 ? -1 : 1;
    const pose = wingPose({ ...bend, allowance: (bend.allowance * Math.abs((2 * i) / FACETS - 1)) as Mm }, thickness, size);
    const inward = thickness - Math.max(0, inset);
    return [sign * pose.x, pose.y, sign * (pose.x - inward * pose.sin), pose.y + inward * pose.cos];
  };
  return Array.from({ length: FACETS }, (_, i) => {
    const [p, q] = [corner(i), corner(i + 1)];
    const ring = (z: number) => [[p[0], p[1], z], [q[0], q[1], z], [q[2], q[3], z], [p[2], p[3], z]].flat();
    return Float64Array.from([...ring(line[0]), ...ring(line[1])]);
  });
}
