import type { FieldProblem } from "../../core/problem";
import { convexOverlap } from "../../geometry/convexOverlap";
import { polygonBounds, type Bounds2 } from "../../geometry/polygonBounds";
import { segmentsCross } from "../../geometry/segmentsCross";
import type { Vec2 } from "../../geometry/vec2";
import { onEdge } from "../edgeCut";
import { cornerPoint } from "./cornerPoint";
import type { FlatZone } from "./flatZone";
import { zoneQuad } from "./zoneQuad";
import type { ZoneCorner } from "./zoneCorner";

/** Zones may lap by rounding (mm). */
const LAP_MM = 1e-3;

/**
 * Zones that keep clear of one another. Where the corner cut out between two flanges is a little small for their bends, one border of
 * each crosses the other's: both end there, and the bit of sheet beyond belongs to neither bend. Zones that lap otherwise are a
 * problem: what lies in both would be bent twice.
 */
export function partZones(zones: readonly FlatZone[]): { readonly zones: readonly FlatZone[]; readonly problems: readonly FieldProblem[] } {
  const parted = [...zones];
  const problems: FieldProblem[] = [];
  const boxes = zones.map((zone) => polygonBounds(zoneQuad(zone)));
  parted.forEach((_, i) => {
    for (let k = 0; k < i; k++) {
      const [a, b, boxA, boxB] = [parted[i], parted[k], boxes[i], boxes[k]];
      if (!a || !b || !boxA || !boxB || a.bend === b.bend || apart(boxA, boxB) || !lap(a, b)) continue;
      const ended = endedAtMeeting(a, b);
      if (ended) [parted[i], parted[k]] = ended;
      else problems.push({ path: a.path, message: `the bends "${a.bend.id}" and "${b.bend.id}" run into one another; move their lines further apart or cut the corner out` });
    }
  });
  return { zones: parted, problems };
}

const lap = (a: FlatZone, b: FlatZone) => convexOverlap(zoneQuad(a), zoneQuad(b)) > LAP_MM;
const apart = (a: Bounds2, b: Bounds2) => a.max[0] < b.min[0] || b.max[0] < a.min[0] || a.max[1] < b.min[1] || b.max[1] < a.min[1];

function endedAtMeeting(a: FlatZone, b: FlatZone): readonly [FlatZone, FlatZone] | null {
  const borders = ["right", "left"] as const;
  const met = borders.flatMap((onA) => borders.flatMap((onB) => {
    const point = segmentsCross(...ends(a, onA), ...ends(b, onB));
    return point ? [{ onA, onB, point }] : [];
  }));
  const [only] = met;
  if (!only || met.length > 1) return null;
  const [first, second] = [endedAt(a, only.onA, only.point), endedAt(b, only.onB, only.point)];
  return lap(first, second) ? null : [first, second];
}

const ends = (zone: FlatZone, border: "right" | "left"): [Vec2, Vec2] => [cornerPoint(zone[border][0]), cornerPoint(zone[border][1])];

/** The zone with the nearer end of one border moved to a point of it. */
function endedAt(zone: FlatZone, border: "right" | "left", point: Vec2): FlatZone {
  const [from, to] = ends(zone, border).map((p) => onEdge(zone.axes, p)[0]);
  const at = onEdge(zone.axes, point)[0];
  const corner: ZoneCorner = { kind: "meeting", point };
  const [start, end] = zone[border];
  return { ...zone, [border]: Math.abs(at - (from ?? 0)) < Math.abs((to ?? 0) - at) ? [corner, end] : [start, corner] };
}
