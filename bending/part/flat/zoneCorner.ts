import type { Vec2 } from "../../geometry/vec2";
import { fromEdge, onEdge, type EdgeAxes } from "../edgeCut";
import type { RingPlace, Rings } from "./ringPlace";

/** A corner this near the border of the zone lies on it (mm). */
const ON_BORDER_MM = 1e-6;
/** An end that leans runs out of the bend by no more than this many times half its allowance; further on it is an edge of the face beside. */
const LEAN = 4;

/**
 * Where a border of a bend zone ends: on the boundary of the sheet; square above `slitFrom`, a corner of the boundary within the
 * zone; or where it meets the border of another zone, from where the end runs to the other border's end.
 */
export type ZoneCorner =
  | { readonly kind: "place"; readonly place: RingPlace }
  | { readonly kind: "slit"; readonly point: Vec2; readonly slitFrom: RingPlace }
  | { readonly kind: "meeting"; readonly point: Vec2 };

/**
 * From the end of a bend line along the boundary to a border of its zone: `side` +1 is the border on the line's left. Null
 * when the boundary comes to the line's other end instead: the line lies too near an edge.
 */
export function zoneCorner(rings: Rings, axes: EdgeAxes, half: number, from: RingPlace, other: RingPlace, atStart: boolean, side: 1 | -1): ZoneCorner | null {
  const ring = rings[from.ring] ?? [];
  const n = ring.length;
  // Material on the left: at the start of a chord the boundary runs down, at its end up.
  const forward = atStart === (side < 0);
  const beyond = (along: number) => (atStart ? onEdge(axes, from.point)[0] - along : along - onEdge(axes, from.point)[0]);
  let [last, lastPlace] = [onEdge(axes, from.point), from];
  let [deepest, deepestPlace] = [0, from];
  for (let k = 0; k <= n; k++) {
    const vertex = (forward ? from.edge + 1 + k : from.edge - k + 2 * n) % n;
    const edge = forward ? (vertex + n - 1) % n : vertex;
    const p = ring[vertex] ?? from.point;
    const here = onEdge(axes, p);
    const depth = here[1] * side;
    if (depth >= half - ON_BORDER_MM) {
      const share = depth <= half + ON_BORDER_MM ? 1 : (half - last[1] * side) / (depth - last[1] * side);
      const along = last[0] + (here[0] - last[0]) * share;
      if (k > 0 && beyond(along) > LEAN * half) return slit(axes, half * side, deepestPlace);
      if (share === 1) return { kind: "place", place: { ring: from.ring, edge: vertex, share: 0, point: p } };
      const point = fromEdge(axes, [along, half * side]);
      return { kind: "place", place: { ring: from.ring, edge, share: shareOf(ring[edge], ring[(edge + 1) % n], point), point } };
    }
    if (depth < 0 && k > 0) return from.ring === other.ring && edge === other.edge ? null : slit(axes, half * side, deepestPlace);
    if (beyond(here[0]) > LEAN * half) return slit(axes, half * side, lastPlace);
    lastPlace = { ring: from.ring, edge: vertex, share: 0, point: p };
    if (depth > deepest + ON_BORDER_MM) [deepest, deepestPlace] = [depth, lastPlace];
    last = here;
  }
  return null;
}

function slit(axes: EdgeAxes, height: number, slitFrom: RingPlace): ZoneCorner {
  return { kind: "slit", point: fromEdge(axes, [onEdge(axes, slitFrom.point)[0], height]), slitFrom };
}

function shareOf(a: Vec2 | undefined, b: Vec2 | undefined, p: Vec2): number {
  return a && b ? Math.hypot(p[0] - a[0], p[1] - a[1]) / Math.hypot(b[0] - a[0], b[1] - a[1]) : 0;
}
