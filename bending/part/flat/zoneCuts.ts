import type { Vec2 } from "../../geometry/vec2";
import { fromEdge, onEdge } from "../edgeCut";
import type { CutEnd, SheetCut } from "./cutSheet";
import { cornerPoint } from "./cornerPoint";
import type { FlatZone } from "./flatZone";
import type { Rings } from "./ringPlace";
import type { ZoneCorner } from "./zoneCorner";

/** A boundary this near the border of a zone does not enter it (mm). */
const ON_BORDER_MM = 1e-6;

/** A cut that bounds a zone; `zone` lies on its left. Cuts square to the line where the boundary ends within the zone bound no side. */
export interface ZoneCut extends SheetCut {
  readonly zone: number;
  readonly border: "left" | "right" | "end";
}

/** The cuts that part a zone from the faces beside it; a notch that enters from a face breaks its border. */
export function zoneCuts(rings: Rings, zone: FlatZone, index: number): readonly ZoneCut[] {
  const border = (from: ZoneCorner, to: ZoneCorner, side: 1 | -1): readonly ZoneCut[] => {
    const ends: CutEnd[] = [endOf(from), ...breaks(rings, zone, from, to, side), endOf(to)];
    const cuts: ZoneCut[] = [];
    for (let i = 0; i + 1 < ends.length; i += 2) {
      const [a, b] = [ends[i], ends[i + 1]];
      if (a && b) cuts.push({ from: a, to: b, zone: index, border: side > 0 ? "left" : "right" });
    }
    return cuts;
  };
  const slits = [...zone.right, ...zone.left].flatMap((corner): readonly ZoneCut[] =>
    (corner.kind === "slit" ? [{ from: corner.slitFrom, to: endOf(corner), zone: index, border: "end" }] : []));
  const ends = ([0, 1] as const).flatMap((end): readonly ZoneCut[] => {
    const [right, left] = [zone.right[end], zone.left[end]];
    return right.kind === "meeting" || left.kind === "meeting" ? [{ from: endOf(right), to: endOf(left), zone: index, border: "end" }] : [];
  });
  return [...border(zone.right[0], zone.right[1], -1), ...border(zone.left[1], zone.left[0], 1), ...slits, ...ends];
}

const endOf = (corner: ZoneCorner): CutEnd => (corner.kind === "place" ? corner.place : { point: corner.point });

function breaks(rings: Rings, { axes, half }: FlatZone, from: ZoneCorner, to: ZoneCorner, side: 1 | -1): readonly CutEnd[] {
  const [a, b] = [onEdge(axes, cornerPoint(from))[0], onEdge(axes, cornerPoint(to))[0]];
  const [least, most] = [Math.min(a, b) + ON_BORDER_MM, Math.max(a, b) - ON_BORDER_MM];
  const found: { readonly along: number; readonly end: CutEnd }[] = [];
  const { origin, along: [ux, uy] } = axes;
  const past = (p: Vec2) => ((p[1] - origin[1]) * ux - (p[0] - origin[0]) * uy) * side - half;
  rings.forEach((points, ring) => {
    let [p, pd] = [points[0] ?? origin, past(points[0] ?? origin)];
    for (let edge = 0; edge < points.length; edge++) {
      const q = points[(edge + 1) % points.length] ?? p;
      const qd = past(q);
      if (pd < -ON_BORDER_MM !== qd < -ON_BORDER_MM) {
        const share = pd / (pd - qd);
        const [pa, qa] = [onEdge(axes, p)[0], onEdge(axes, q)[0]];
        const along = pa + (qa - pa) * share;
        if (along > least && along < most) found.push({ along, end: { ring, edge, share: Math.min(Math.max(share, 0), 1), point: fromEdge(axes, [along, half * side]) } });
      }
      [p, pd] = [q, qd];
    }
  });
  return found.sort((p, q) => (p.along - q.along) * (b > a ? 1 : -1)).map(({ end }) => end);
}
