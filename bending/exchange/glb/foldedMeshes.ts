import { invariant } from "../../core/invariant";
import { applyFrame } from "../../geometry/applyFrame";
import type { FlatPoint } from "../../geometry/vec2";
import { bendArc } from "../../part/bendArc";
import { bendDirections } from "../../part/bendDirections";
import { foldFrames } from "../../part/foldFrames";
import type { FlatRegion, PartModel } from "../../part/partModel";
import { pointOnBendArc } from "../../part/pointOnBendArc";
import type { FoldedMesh } from "./foldedMesh";
import { plateMesh, type Fold } from "./plateMesh";
import { cutRegions, faceRegions, zoneRegions } from "./sheetRegions";

/** A bend is drawn in slices of this angle at most: chords stand 0.03 % of the radius off the arc. */
const SLICE = (3 * Math.PI) / 180;

/** Edges on the cut between two slices lie this near to it (mm). */
const ON_CUT_MM = 1e-7;

/** The finished part as one closed body a face and one a bend, named after them. */
export function foldedMeshes(part: PartModel): readonly FoldedMesh[] {
  const angles = part.bends.map((bend) => bend.angle);
  const frames = foldFrames(part, angles);
  const faces = part.faces.map((face, i): FoldedMesh => {
    const frame = frames[i];
    invariant(frame, "a frame for each face");
    return { name: face.id, kind: "face", ...plateMesh(faceRegions(part, i), part.thickness, ([x, y], z) => applyFrame(frame, [x, y, z]), () => false) };
  });
  return [...faces, ...part.bends.map((_, i) => bendMesh(part, i, frames))];
}

function bendMesh(part: PartModel, index: number, frames: ReturnType<typeof foldFrames>): FoldedMesh {
  const bend = part.bends[index];
  const frame = frames[bend?.parent ?? -1];
  invariant(bend && frame, "a bend of the part");
  const { along, outward } = bendDirections(bend);
  const origin = bend.zone[0];
  const across = ([x, y]: FlatPoint) => (x - origin[0]) * outward[0] + (y - origin[1]) * outward[1];
  const arc = bendArc(part, bend, bend.angle);
  const fold: Fold = (point, z) => {
    const u = across(point);
    const s = (point[0] - origin[0]) * along[0] + (point[1] - origin[1]) * along[1];
    const [forward, height] = pointOnBendArc(arc, u / bend.allowance, arc.sense * (arc.neutralHeight - z));
    return applyFrame(frame, [origin[0] + along[0] * s + outward[0] * forward, origin[1] + along[1] * s + outward[1] * forward, height]);
  };
  const regions = zoneRegions(part, index);
  const count = Math.max(1, Math.ceil(bend.angle / SLICE));
  const cuts = Array.from({ length: count - 1 }, (_, i) => (bend.allowance * (i + 1)) / count);
  const slices = count === 1 ? regions : sliced(regions, [-1, ...cuts, bend.allowance + 1], origin, along, outward);
  const onCut = (a: FlatPoint, b: FlatPoint) => cuts.some((cut) => Math.abs(across(a) - cut) < ON_CUT_MM && Math.abs(across(b) - cut) < ON_CUT_MM);
  return { name: `${bend.id}, bend`, kind: "bend", ...plateMesh(slices, part.thickness, fold, onCut) };
}

/** The regions cut across into bands between neighbouring values of `at`. */
function sliced(regions: readonly FlatRegion[], at: readonly number[], origin: FlatPoint, along: FlatPoint, outward: FlatPoint): readonly FlatRegion[] {
  const spread = regions.flatMap(({ outline }) => outline).map(([x, y]) => (x - origin[0]) * along[0] + (y - origin[1]) * along[1]);
  const [from, to] = [Math.min(...spread) - 1, Math.max(...spread) + 1];
  const point = (s: number, u: number): FlatPoint => [origin[0] + along[0] * s + outward[0] * u, origin[1] + along[1] * s + outward[1] * u];
  return at.slice(1).flatMap((end, i) => {
    const begin = at[i] ?? 0;
    return cutRegions(regions, [[point(from, begin), point(from, end), point(to, end), point(to, begin)]], "inside");
  });
}
