import * as polyclip from "polyclip-ts";
import type { FlatPoint } from "../../geometry/vec2";
import type { FlatRegion, PartModel } from "../../part/partModel";

type Ring = [number, number][];

const ring = (polygon: readonly FlatPoint[]): Ring => polygon.map(([x, y]): [number, number] => [x, y]);
const open = (closed: Ring): readonly FlatPoint[] => closed.slice(0, -1);
const asPolygon = ({ outline, holes }: FlatRegion): Ring[] => [ring(outline), ...holes.map(ring)];

/** Regions with what the cutters cover taken off, or kept alone. */
export function cutRegions(regions: readonly FlatRegion[], cutters: readonly (readonly FlatPoint[])[], keep: "outside" | "inside"): readonly FlatRegion[] {
  if (cutters.length === 0) return keep === "outside" ? regions : [];
  const [first, ...rest] = cutters.map((cutter) => [ring(cutter)]);
  if (!first) return regions;
  const whole = regions.map(asPolygon);
  return (keep === "outside" ? polyclip.difference(whole, first, ...rest) : polyclip.intersection(whole, polyclip.union(first, ...rest)))
    .map(([outline = [], ...holes]) => ({ outline: open(outline), holes: holes.map(open) }));
}

/** The sheet of a face, and of a bend's zone, holes that reach across bends taken off. */
export function faceRegions(part: PartModel, face: number): readonly FlatRegion[] {
  const { outline, holes } = part.faces[face] ?? { outline: [], holes: [] };
  return cutRegions([{ outline, holes }], part.holesAcross.filter((hole) => hole.faces.includes(face)).map((hole) => hole.outline), "outside");
}

export function zoneRegions(part: PartModel, bend: number): readonly FlatRegion[] {
  const own = part.bends[bend];
  if (!own) return [];
  return cutRegions(own.region ?? [{ outline: own.zone, holes: [] }], part.holesAcross.filter((hole) => hole.bends.includes(bend)).map((hole) => hole.outline), "outside");
}
