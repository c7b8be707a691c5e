import { mm, rad } from "../core/units";
import { invariant } from "../core/invariant";
import type { FlatPoint } from "../geometry/vec2";
import type { Bend, Face, PartModel } from "../part/partModel";
import type { BendSplit } from "./bendSplit";
import { stripId } from "./drawnIds";
import { hitId } from "./hitId";
import { widened } from "./widened";

/** A part in whose tree every stroke is a bend of its own. */
export interface SplitPart {
  readonly part: PartModel;
  /** For every bend the bits of the bends that it was split into together with it; 0 where it was not split. They lie in a row, the parent's side first. */
  readonly rows: readonly number[];
  /** For every bend as it was before, the bits of the bends that stand for it now. */
  readonly bitsOf: readonly number[];
}

/** Can the bend be cut into strips? Its zone must be whole, and run along straight edges of both its faces. */
export function canSplit(part: PartModel, bend: Bend): boolean {
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  return bend.region === null && bend.strokeWith === null && bend.hem === null
    && widened(part.faces[bend.parent]?.outline ?? [], parentStart, parentEnd, parentStart, parentEnd) !== null
    && widened(part.faces[bend.child]?.outline ?? [], childEnd, childStart, childEnd, childStart) !== null;
}

/**
 * Puts a row of bends, and plane strips between them, in place of each bend that is split; all else keeps its order. The strip before the
 * first and the one behind the last belong to the faces there.
 */
export function splitBends(part: PartModel, splits: readonly BendSplit[]): SplitPart {
  const bySplit = new Map(splits.map((split) => [split.bend, split]));
  const faces: Face[] = part.faces.slice(0, 1).map((face) => ({ ...face }));
  const bends: Bend[] = [];
  const rows: number[] = [];
  const newFace: number[] = [0];
  const newBends: number[][] = [];
  part.bends.forEach((bend, index) => {
    const parent = newFace[bend.parent];
    const child = part.faces[bend.child];
    invariant(parent !== undefined && child, "a parent stands before its children");
    const row = hitsOf(part, bend, bySplit.get(bend.id));
    const first = bends.length;
    const bits = row.length > 1 ? row.reduce((mask, _, k) => mask | (1 << (first + k)), 0) : 0;
    row.forEach((hit, k) => {
      const last = k === row.length - 1;
      bends.push({ ...hit, parent: k === 0 ? parent : faces.length - 1, child: faces.length });
      rows.push(bits);
      faces.push(last ? { ...child, bend: bends.length - 1 } : strip(row, k, bends.length - 1));
    });
    newFace[bend.child] = faces.length - 1;
    newBends[index] = row.map((_, k) => first + k);
    if (row.length > 1) widenNeighbours(faces, bend, row, parent, faces.length - 1);
  });
  const moved = (index: number | null) => (index === null ? null : newBends[index]?.[0] ?? null);
  return {
    part: {
      ...part,
      faces,
      bends: bends.map((bend) => ({ ...bend, strokeWith: moved(bend.strokeWith) })),
      holesAcross: part.holesAcross.map((hole) => ({ ...hole, bends: hole.bends.flatMap((index) => newBends[index] ?? []), faces: hole.faces.map((index) => newFace[index] ?? 0) })),
    },
    rows,
    bitsOf: newBends.map((row) => row.reduce((mask, index) => mask | (1 << index), 0)),
  };
}

/** The bends in a row; the bend itself when it is not split. */
function hitsOf(part: PartModel, bend: Bend, split: BendSplit | undefined): readonly Bend[] {
  if (split === undefined || split.hits < 2 || !canSplit(part, bend)) return [bend];
  const angle = rad(bend.angle / split.hits);
  const share = split.allowance / bend.allowance;
  return Array.from({ length: split.hits }, (_, k): Bend => {
    const middle = (k + 0.5) / split.hits;
    const [from, to] = [middle - share / 2, middle + share / 2];
    return {
      ...bend,
      id: hitId(bend.id, k + 1, split.hits),
      angle,
      allowance: split.allowance,
      insideRadius: mm(split.allowance / angle - bend.k * part.thickness),
      line: [across(bend, middle, "start"), across(bend, middle, "end")],
      zone: [across(bend, from, "start"), across(bend, to, "start"), across(bend, to, "end"), across(bend, from, "end")],
    };
  });
}

/** The point of the zone's start or end side that lies so far over from the parent's tangent (0) to the child's (1). */
function across({ zone: [parentStart, childStart, childEnd, parentEnd] }: Bend, share: number, end: "start" | "end"): FlatPoint {
  const [p, c] = end === "start" ? [parentStart, childStart] : [parentEnd, childEnd];
  return [p[0] + (c[0] - p[0]) * share, p[1] + (c[1] - p[1]) * share];
}

/** The plane strip behind stroke `k` of a row, counter-clockwise. */
function strip(row: readonly Bend[], k: number, carriedBy: number): Face {
  const [before, after] = [row[k], row[k + 1]];
  invariant(before && after, "a strip lies between two strokes of a row");
  return { id: stripId(before.id), outline: [before.zone[1], after.zone[0], after.zone[3], before.zone[2]], holes: [], holeContours: [], bend: carriedBy };
}

/** Gives the half strips before the first stroke and behind the last to the faces there. */
function widenNeighbours(faces: Face[], bend: Bend, row: readonly Bend[], parent: number, child: number): void {
  const [first, last] = [row[0], row[row.length - 1]];
  const [before, behind] = [faces[parent], faces[child]];
  invariant(first && last && before && behind, "a row has two ends");
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  faces[parent] = { ...before, outline: widened(before.outline, parentStart, parentEnd, first.zone[0], first.zone[3]) ?? before.outline };
  faces[child] = { ...behind, outline: widened(behind.outline, childEnd, childStart, last.zone[2], last.zone[1]) ?? behind.outline };
}
