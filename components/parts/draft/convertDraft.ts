import type { LengthUnit } from "@/bending/core/units";
import { mmPer } from "@/bending/core/units";
import type { DocumentHole, DocumentVertex, FlatShape } from "@/bending/part/partDocument";
import { convertLengthText } from "@/lib/format/convertLengthText";
import type { CornerDraft, HoleDraft, PartDraft, ReliefDraft } from "./partDraft";

/** The same part said in the other unit; texts that cannot be read stay as typed. */
export function convertDraft(draft: PartDraft, units: LengthUnit): PartDraft {
  if (units === draft.units) return draft;
  const text = (typed: string) => convertLengthText(typed, draft.units, units);
  const scale = mmPer(draft.units) / mmPer(units);
  const hole = (one: HoleDraft): HoleDraft => one.kind === "kept"
    ? { ...one, hole: scaledHole(one.hole, scale) }
    : one.kind === "circle" ? { ...one, x: text(one.x), y: text(one.y), diameter: text(one.diameter) }
    : one.kind === "slot" ? { ...one, x: text(one.x), y: text(one.y), toX: text(one.toX), toY: text(one.toY), width: text(one.width) }
    : { ...one, x: text(one.x), y: text(one.y), width: text(one.width), height: text(one.height) };
  const cuts = <T extends { readonly relief: ReliefDraft; readonly corner: CornerDraft }>(of: T) => ({
    relief: { ...of.relief, width: text(of.relief.width), depth: text(of.relief.depth) }, corner: { ...of.corner, gap: text(of.corner.gap) },
  });
  return {
    ...draft, ...cuts(draft), units, thickness: text(draft.thickness), insideRadius: text(draft.insideRadius), toleranceLength: text(draft.toleranceLength), width: text(draft.width),
    legs: draft.legs.map((leg) => ({ ...leg, length: text(leg.length), bend: { ...leg.bend, insideRadius: text(leg.bend.insideRadius), gap: text(leg.bend.gap) } })),
    base: {
      ...draft.base, width: text(draft.base.width), depth: text(draft.base.depth),
      vertices: draft.base.vertices.map((vertex) => ({ ...vertex, x: text(vertex.x), y: text(vertex.y) })),
      holes: draft.base.holes.map(hole),
    },
    flanges: draft.flanges.map((flange) => ({
      ...flange, ...cuts(flange), offsetHeight: text(flange.offsetHeight), length: text(flange.length), start: text(flange.start), end: text(flange.end), insideRadius: text(flange.insideRadius), gap: text(flange.gap),
      toleranceLength: text(flange.toleranceLength),
      holes: flange.holes.map(hole), outline: flange.outline?.map((vertex) => scaledVertex(vertex, scale)) ?? null,
    })),
    flat: draft.flat === null ? null : scaledFlat(draft.flat, scale),
    flatBends: draft.flatBends.map((bend) => ({ ...bend, insideRadius: text(bend.insideRadius), gap: text(bend.gap) })),
  };
}

function scaledVertex(vertex: DocumentVertex, scale: number): DocumentVertex {
  return vertex[2] === undefined ? [vertex[0] * scale, vertex[1] * scale] : [vertex[0] * scale, vertex[1] * scale, vertex[2]];
}

function scaledHole(hole: DocumentHole, scale: number): DocumentHole {
  const point = (p: readonly [number, number]): readonly [number, number] => [p[0] * scale, p[1] * scale];
  if ("circle" in hole) return { circle: point(hole.circle), diameter: hole.diameter * scale };
  if ("slot" in hole) return { slot: [point(hole.slot[0]), point(hole.slot[1])], width: hole.width * scale };
  return { polygon: hole.polygon.map((vertex) => scaledVertex(vertex, scale)) };
}

function scaledFlat(flat: FlatShape, scale: number): FlatShape {
  return {
    ...flat, outline: flat.outline.map((vertex) => scaledVertex(vertex, scale)),
    ...(flat.holes === undefined ? {} : { holes: flat.holes.map((hole) => scaledHole(hole, scale)) }),
    bends: flat.bends.map((bend) => ({
      ...bend, line: [[bend.line[0][0] * scale, bend.line[0][1] * scale], [bend.line[1][0] * scale, bend.line[1][1] * scale]],
      ...(bend.insideRadius === undefined ? {} : { insideRadius: bend.insideRadius * scale }),
      ...(bend.gap === undefined ? {} : { gap: bend.gap * scale }),
    })),
  };
}
