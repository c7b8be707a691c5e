import { PARALLEL_RAD, SAME_SIZE_MM } from "../core/tolerance";
import { dotProduct } from "../geometry/dotProduct";
import { signedArea } from "../geometry/signedArea";
import { turnByFrame } from "../geometry/turnByFrame";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";
import { endPoint } from "./endPoint";
import { endPosition } from "./endPosition";
import { faceEnds } from "./faceEnds";
import type { DimensionEnd, PartDimension } from "./partDimension";
import { seenFrom } from "./seenFrom";

/**
 * The sizes of the folded part over all: square to its largest face, and in that face across its bends. They are measured
 * from that face, so what hangs on it by several bends swings with all their angles.
 */
export function overallDimensions(part: PartModel): readonly PartDimension[] {
  if (part.bends.length === 0) return [];
  const face = largestFace(part);
  const frames = seenFrom(part, face);
  const ends = [...corners(part), ...part.bends.map((_, bend): DimensionEnd => ({ at: "arc", bend }))];
  return axesOf(part, face).map((direction): PartDimension => {
    const farthest = (way: 1 | -1): readonly DimensionEnd[] => {
      const places = ends.map((end) => (end.at === "arc" && !standsOut(part, frames, end.bend, direction, way) ? -Infinity : way * endPosition(frames, endPoint(part, end, null), direction, way)));
      const most = Math.max(...places);
      return ends.filter((_, i) => (places[i] ?? 0) > most - SAME_SIZE_MM);
    };
    return { kind: "overall", face, direction, from: fewOf(farthest(-1)), to: fewOf(farthest(1)) };
  });
}

function largestFace(part: PartModel): number {
  const areas = part.faces.map(({ outline, holes }) => Math.abs(signedArea(outline)) - holes.reduce((sum, hole) => sum + Math.abs(signedArea(hole)), 0));
  return areas.reduce((best, area, i) => (area > (areas[best] ?? 0) + SAME_SIZE_MM ? i : best), 0);
}

function axesOf(part: PartModel, face: number): readonly Vec3[] {
  const axes: Vec3[] = [[0, 0, 1]];
  for (const { out } of faceEnds(part, face)) {
    const axis: Vec3 = [out[0], out[1], 0];
    if (axes.every((known) => Math.abs(dotProduct(known, axis)) < Math.cos(PARALLEL_RAD))) axes.push(axis);
  }
  return axes;
}

function corners(part: PartModel): readonly DimensionEnd[] {
  return part.faces.flatMap(({ outline, id }, face) =>
    outline.flatMap((p) => [0, part.thickness].map((z): DimensionEnd => ({ at: "point", face, point: [p[0], p[1], z], name: id }))));
}

/** Does the bend's outside stand out in this direction, beyond its faces? */
function standsOut(part: PartModel, frames: readonly Frame[], index: number, direction: Vec3, way: 1 | -1): boolean {
  const bend = part.bends[index];
  const parent = frames[bend?.parent ?? -1];
  if (!bend || !parent) return false;
  const { along, outward } = bendDirections(bend);
  if (Math.abs(dotProduct(turnByFrame(parent, [along[0], along[1], 0]), direction)) > PARALLEL_RAD) return false;
  // The arc looks from the parent's outside over to the child's; its middle looks half-way.
  const sine = Math.sin(bend.angle / 2);
  const middle: Vec3 = [sine * outward[0], sine * outward[1], Math.cos(bend.angle / 2) * (bend.direction === "up" ? -1 : 1)];
  return way * dotProduct(turnByFrame(parent, middle), direction) > Math.cos(bend.angle / 2) + 1e-6;
}

/** At most eight, spread over all: the corners of a long rounded edge say the same over and over. */
function fewOf(ends: readonly DimensionEnd[]): readonly DimensionEnd[] {
  const MOST = 8;
  return ends.length <= MOST ? ends : Array.from({ length: MOST }, (_, i) => ends[Math.floor((i * (ends.length - 1)) / (MOST - 1))]).filter((end) => end !== undefined);
}
