import type { FieldProblem } from "../../core/problem";
import { fail, ok, type Result } from "../../core/result";
import type { LengthUnit } from "../../core/units";
import type { MaterialFacts } from "../../handbook/material";
import type { BendContext } from "../bendContext";
import { edgeAxes } from "../edgeCut";
import { holeAsChords } from "../holeAsChords";
import { holeContour } from "../holeContour";
import { holeWithin } from "../holeWithin";
import { outlineAsChords } from "../outlineAsChords";
import { outlineCircles } from "../outlineCircles";
import type { FlatShape, PartDocument } from "../partDocument";
import type { PartShape } from "../partModel";
import { resolveBend } from "../resolveBend";
import { sheetHoles } from "../sheetHoles";
import { strokePartners } from "../strokePartners";
import { cutProblems } from "./cutProblems";
import { cutSheet } from "./cutSheet";
import { joinZones } from "./joinZones";
import { partingHoles } from "./partingHoles";
import { partZones } from "./partZones";
import { zoneCuts } from "./zoneCuts";
import { zonesOfLine } from "./zonesOfLine";

/**
 * A flat as drawn with its bend lines: the borders of each line's zone part the sheet, the largest piece (or the one at `base`)
 * stays where it is, every other face is named after the bend that carries it. The flat is kept as it is; the folded
 * part follows from it.
 */
export function buildFlat(
  flat: FlatShape, document: PartDocument, units: LengthUnit, material: MaterialFacts, context: BendContext,
): Result<PartShape, readonly FieldProblem[]> {
  const { points } = outlineAsChords(flat.outline);
  const holes = (flat.holes ?? []).map((hole, i) => ({ path: `flat.holes[${i}]`, outline: holeAsChords(hole), contour: holeContour(hole, (p) => p, false), face: null }));
  const lines = flat.bends.map((entry, i) => {
    const bend = resolveBend(entry, document, material, context);
    return { bend, strokeWith: entry.strokeWith ?? null, path: `flat.bends[${i}].line`, axes: edgeAxes({ from: entry.line[0], to: entry.line[1] }), half: bend.allowance / 2 };
  });
  const parting = new Set(partingHoles(points, holes.map(({ outline }) => outline), lines.map(({ axes }) => axes)));
  const rings = [points, ...holes.filter((_, i) => parting.has(i)).map(({ outline }) => [...outline].reverse())];
  const problems: FieldProblem[] = holes.filter((hole, i) => parting.has(i) && !holeWithin(hole.outline, points))
    .map(({ path }) => ({ path, message: "the hole reaches over the edge of the sheet; move it inwards or make it smaller" }));
  const found = lines.flatMap((line) => {
    const zones = zonesOfLine(rings, line, units);
    if (!zones.ok) problems.push(zones.error);
    return zones.ok ? zones.value : [];
  });
  const { zones, problems: meetings } = partZones(found);
  if (problems.length === 0) problems.push(...meetings);
  if (problems.length > 0) return fail(problems);
  const cuts = zones.flatMap((zone, i) => zoneCuts(rings, zone, i));
  const cutUp = cutSheet(rings, cuts);
  const crossing = cutProblems(rings, cutUp, cuts, zones);
  if (crossing.length > 0) return fail(crossing);
  const joined = joinZones(cutUp, cuts, zones, flat.base);
  if (!joined.ok) return joined;
  const bends = strokePartners(joined.value.bends, new Map(flat.bends.map(({ id, strokeWith }, i) => [id, { strokeWith: strokeWith ?? null, path: `flat.bends[${i}].strokeWith` }])));
  if (!bends.ok) return bends;
  const sorted = sheetHoles({ ...joined.value, bends: bends.value }, () => points, holes.filter((_, i) => !parting.has(i)));
  if (sorted.problems.length > 0) return fail(sorted.problems);
  return ok({
    faces: sorted.faces,
    bends: bends.value,
    holesAcross: sorted.across,
    circles: outlineCircles(flat.outline),
    drawnFlat: {
      outline: { kind: "path", vertices: flat.outline.map(([x, y, bulge]) => [x, y, bulge ?? 0]) },
      holes: holes.filter((_, i) => parting.has(i)).map(({ contour }) => contour),
    },
  });
}
