import { MEANT_CONTACT_MM } from "../core/tolerance";
import { applyFrame } from "../geometry/applyFrame";
import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import { identityFrame } from "../geometry/identityFrame";
import { invertFrame } from "../geometry/invertFrame";
import type { Vec2 } from "../geometry/vec2";
import type { Vec3 } from "../geometry/vec3";
import { bendFacets } from "../part/bendFacets";
import { bendFrame } from "../part/bendFrame";
import type { PartModel } from "../part/partModel";
import type { FacePath } from "./facePath";
import { facetCount } from "./facetCount";
import type { Prism } from "./prism";

/**
 * A face as convex plates, with the bend zone on its near side, where they stand to their wing when the bends on the way
 * are formed as `state` says (bits over bend indices) and flat otherwise. `pieces`: the face cut into convex pieces.
 */
export function prismsOf(part: PartModel, path: FacePath, state: number, pieces: readonly (readonly Vec2[])[]): readonly Prism[] {
  let near: Frame = identityFrame;
  let frame: Frame = identityFrame;
  let at = path.wingIsParent ? path.line.bend.parent : path.line.bend.child;
  let zone: readonly Prism[] = [];
  path.bends.forEach((index, k) => {
    const bend = part.bends[index];
    if (!bend) return;
    const angle = (state >> index) & 1 ? bend.angle : 0;
    const step = bendFrame(part, bend, angle);
    const outward = bend.parent === at;
    near = frame;
    frame = composeFrames(frame, outward ? step : invertFrame(step));
    at = outward ? bend.child : bend.parent;
    if (k < path.bends.length - 1) return;
    const facets = bendFacets(part, index, angle, facetCount(part, bend, angle));
    zone = facets.map((facet) => prism("zone", part, path, outward ? near : frame, facet.outside, facet.inside));
  });
  const t = part.thickness;
  const plates = pieces.map((piece) => prism("face", part, path, frame, piece.map(([x, y]): Vec3 => [x, y, 0]), piece.map(([x, y]): Vec3 => [x, y, t])));
  return [...plates, ...zone];
}

function prism(of: Prism["of"], part: PartModel, path: FacePath, frame: Frame, one: readonly Vec3[], other: readonly Vec3[]): Prism {
  const { bend, across, along, middle } = path.line;
  const [start] = bend.line;
  const sign = path.wingIsParent ? -1 : 1;
  const points = new Float64Array(6 * one.length);
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  [...one, ...other].forEach((corner, i) => {
    const [x, y, z] = applyFrame(frame, corner);
    const a = sign * (across[0] * (x - start[0]) + across[1] * (y - start[1])) - bend.allowance / 2;
    const b = bend.direction === "up" ? z : part.thickness - z;
    [a, b, along[0] * x + along[1] * y - middle].forEach((value, j) => {
      points[3 * i + j] = value;
      low[j] = Math.min(low[j] ?? value, value);
      high[j] = Math.max(high[j] ?? value, value);
    });
  });
  const range = (j: number): readonly [number, number] => [low[j] ?? 0, high[j] ?? 0];
  const b = range(1);
  const lies = b[0] < -MEANT_CONTACT_MM ? "outside" : b[1] > part.thickness + MEANT_CONTACT_MM ? "inside" : "plane";
  return { of, count: one.length, points, lies, a: range(0), b, z: range(2) };
}
