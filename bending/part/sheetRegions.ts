import * as polyclip from "polyclip-ts";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import { signedArea } from "../geometry/signedArea";
import type { FlatPoint } from "../geometry/vec2";
import type { FlatRegion, PartModel } from "./partModel";

/** The sheet that is really there, piece by piece. */
export interface SheetRegions {
  /** By face; more than one piece only where holes across bends part the face. */
  readonly faces: readonly (readonly FlatRegion[])[];
  /** By bend, the sheet within its zone. */
  readonly zones: readonly (readonly FlatRegion[])[];
}

/** Faces and bend zones with everything taken off that is cut out: holes in faces, notches and windows in zones, holes across bends. */
export function sheetRegions(part: PartModel): SheetRegions {
  const cut = (regions: readonly FlatRegion[], holes: readonly (readonly FlatPoint[])[]): readonly FlatRegion[] =>
    (holes.length === 0 ? regions : regions.flatMap((region) => less(region, holes)));
  return {
    faces: part.faces.map(({ outline, holes }, i) => cut([{ outline, holes }], part.holesAcross.filter(({ faces }) => faces.includes(i)).map((hole) => hole.outline))),
    zones: part.bends.map(({ zone, region }, i) => cut(region ?? [{ outline: zone, holes: [] }], part.holesAcross.filter(({ bends }) => bends.includes(i)).map((hole) => hole.outline))),
  };
}

function less({ outline, holes }: FlatRegion, taken: readonly (readonly FlatPoint[])[]): readonly FlatRegion[] {
  const ring = (points: readonly FlatPoint[]): [number, number][] => points.map(([x, y]) => [x, y]);
  const open = (points: readonly [number, number][] | undefined): readonly FlatPoint[] => (points ?? []).slice(0, -1).map(([x, y]): FlatPoint => [x, y]);
  return polyclip.difference([ring(outline), ...holes.map(ring)], ...taken.map((hole) => [ring(hole)]))
    .map(([outer, ...inner]) => ({ outline: open(outer), holes: inner.map(open) }))
    .filter((region) => Math.abs(signedArea(region.outline)) > EMPTY_AREA_MM2);
}
