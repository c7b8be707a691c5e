import * as polyclip from "polyclip-ts";
import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import type { LengthUnit } from "../core/units";
import { cleanPolygon } from "../geometry/cleanPolygon";
import { convexOverlap } from "../geometry/convexOverlap";
import { polygonContains } from "../geometry/polygonContains";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import type { MaterialFacts } from "../handbook/material";
import type { BendContext } from "./bendContext";
import { bendStrip, stripCorners, type BendStrip } from "./bendStrip";
import { fromEdge } from "./edgeCut";
import { holeAsChords } from "./holeAsChords";
import { holeContour } from "./holeContour";
import { outlineAsChords } from "./outlineAsChords";
import { outlineCircles } from "./outlineCircles";
import { sheetHoles } from "./sheetHoles";
import type { FlatShape, PartDocument } from "./partDocument";
import type { Bend, Face, PartModel, PartShape } from "./partModel";
import { resolveBend, type ResolvedBend } from "./resolveBend";

/** Zones may lap by rounding (mm); strips are cut this much longer than the sheet, so that no sliver stays. */
const LAP_MM = 1e-3;
const BEYOND_MM = 0.06;

interface FlatBend {
  readonly bend: ResolvedBend;
  readonly strip: BendStrip;
  readonly path: string;
}

/**
 * A flat as drawn with its bend lines: each line's zone parts the sheet, the largest piece is the base, every other face is named
 * after the bend that carries it. The flat is kept as it is; the folded part follows from it.
 */
export function buildFlat(
  flat: FlatShape, document: PartDocument, units: LengthUnit, material: MaterialFacts, context: BendContext,
): Result<PartShape, readonly FieldProblem[]> {
  const { points } = outlineAsChords(flat.outline);
  const problems: FieldProblem[] = [];
  const bends: FlatBend[] = [];
  flat.bends.forEach((entry, i) => {
    const path = `flat.bends[${i}].line`;
    const bend = resolveBend(entry, document, material, context);
    const strip = bendStrip(points, entry.line, bend.allowance, path, units);
    if (!strip.ok) problems.push(strip.error);
    else {
      const corners = stripCorners(strip.value);
      const other = bends.find((earlier) => convexOverlap(stripCorners(earlier.strip), corners) > LAP_MM);
      if (other) problems.push({ path, message: `the bends "${entry.id}" and "${other.bend.id}" run into one another; move their lines further apart or cut the corner out` });
      else bends.push({ bend, strip: strip.value, path });
    }
  });
  if (problems.length > 0) return fail(problems);
  const pieces = cutUp(points, bends);
  const joined = joinPieces(pieces, bends);
  if (!joined.ok) return joined;
  const holes = sheetHoles(joined.value, () => points, (flat.holes ?? []).map((hole, i) => ({
    path: `flat.holes[${i}]`, outline: holeAsChords(hole), contour: holeContour(hole, (p) => p, false), face: null,
  })));
  if (holes.problems.length > 0) return fail(holes.problems);
  return ok({
    faces: holes.faces, bends: joined.value.bends, holesAcross: holes.across, circles: outlineCircles(flat.outline),
    drawnFlat: { outline: { kind: "path", vertices: flat.outline.map(([x, y, bulge]) => [x, y, bulge ?? 0]) }, holes: [] },
  });
}

function cutUp(points: readonly Vec2[], bends: readonly FlatBend[]): readonly (readonly Vec2[])[] {
  if (bends.length === 0) return [points];
  const ring = (polygon: readonly Vec2[]) => [polygon.map(([x, y]): [number, number] => [x, y])];
  return polyclip.difference(ring(points), ...bends.map(({ strip }) => ring(stripCorners(strip, BEYOND_MM))))
    .map((polygon) => cleanPolygon((polygon[0] ?? []).slice(0, -1).map(([x, y]): Vec2 => [x, y])))
    .map((piece) => (signedArea(piece) < 0 ? [...piece].reverse() : piece))
    .filter((piece) => signedArea(piece) > EMPTY_AREA_MM2);
}

/** Numbers the pieces from the largest outwards, bend by bend. */
function joinPieces(pieces: readonly (readonly Vec2[])[], bends: readonly FlatBend[]): Result<Pick<PartModel, "faces" | "bends">, readonly FieldProblem[]> {
  const sides = bends.map(({ strip }) => {
    const middle = (strip.middle[0] + strip.middle[1]) / 2;
    const pieceAt = (depth: number) => pieces.findIndex((piece) => polygonContains(piece, fromEdge(strip.axes, [middle, depth])));
    return { left: pieceAt(strip.half + LAP_MM), right: pieceAt(-strip.half - LAP_MM) };
  });
  const bad = sides.findIndex(({ left, right }) => left === right || left < 0 || right < 0);
  if (bad >= 0) return fail([{ path: bends[bad]?.path ?? "flat.bends", message: "the bend line does not part the sheet in two; it must run from edge to edge" }]);
  const largest = pieces.reduce((best, piece, i) => (signedArea(piece) > signedArea(pieces[best] ?? []) + EMPTY_AREA_MM2 ? i : best), 0);
  const index = new Map([[largest, 0]]);
  const faces: Face[] = [{ id: "base", outline: pieces[largest] ?? [], holes: [], holeContours: [], bend: null }];
  const made: Bend[] = [];
  const waiting = bends.map((flatBend, i) => ({ ...flatBend, ...sides[i] }));
  while (waiting.length > 0) {
    const next = waiting.findIndex(({ left, right }) => index.has(left ?? -1) !== index.has(right ?? -1));
    const [taken] = next < 0 ? [] : waiting.splice(next, 1);
    if (!taken) return fail([{ path: waiting[0]?.path ?? "flat.bends", message: "the bends close a ring; a sheet folds only as a tree of faces" }]);
    const leftIsParent = index.has(taken.left ?? -1);
    const [parent, child] = leftIsParent ? [taken.left ?? 0, taken.right ?? 0] : [taken.right ?? 0, taken.left ?? 0];
    made.push(bendOf(taken, leftIsParent, index.get(parent) ?? 0, faces.length));
    index.set(child, faces.length);
    faces.push({ id: taken.bend.id, outline: pieces[child] ?? [], holes: [], holeContours: [], bend: made.length - 1 });
  }
  return ok({ faces, bends: made });
}

function bendOf({ bend, strip }: FlatBend, leftIsParent: boolean, parent: number, child: number): Bend {
  const { source, basis, ...resolved } = bend;
  const [rightStart, rightEnd, leftEnd, leftStart] = stripCorners(strip);
  const line = [fromEdge(strip.axes, [strip.middle[0], 0]), fromEdge(strip.axes, [strip.middle[1], 0])] as const;
  return {
    ...resolved,
    allowanceSource: source,
    allowanceBasis: basis,
    parent,
    child,
    region: null,
    strokeWith: null,
    // Drawn the other way round when the parent would lie on its right.
    line: leftIsParent ? line : [line[1], line[0]],
    zone: leftIsParent ? [leftStart, rightStart, rightEnd, leftEnd] : [rightEnd, leftEnd, leftStart, rightStart],
  };
}
