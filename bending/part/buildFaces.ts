import { mm, type LengthUnit } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { MaterialFacts } from "../handbook/material";
import type { BendContext } from "./bendContext";
import { checkFaceLengths } from "./checkFaceLengths";
import { developedOutline } from "./developedOutline";
import { drawnBase } from "./drawnBase";
import { edgeCutsOf } from "./edgeCutsOf";
import type { FaceWork, FlangeWork } from "./faceWork";
import { holeAsChords } from "./holeAsChords";
import { holeContour } from "./holeContour";
import { parentsFirst } from "./parentsFirst";
import type { PartDocument } from "./partDocument";
import type { Bend, Face, PartShape } from "./partModel";
import type { PartSource } from "./partSource";
import { placeFlange } from "./placeFlange";
import { sheetHoles, type SheetHole } from "./sheetHoles";
import { placeOnSheet } from "./sheetPlacement";
import { planeOutline } from "./planeOutline";
import { resolveBend } from "./resolveBend";

/**
 * Base and flanges as faces and bends of the unfolded sheet, parents first. A flange whose parent failed is
 * left out, so that each problem is told once, where it begins.
 */
export function buildFaces(
  source: PartSource, document: PartDocument, units: LengthUnit, material: MaterialFacts, context: BendContext,
): Result<PartShape, readonly FieldProblem[]> {
  const thickness = mm(document.thickness);
  const dimension = document.dimension ?? "outside";
  const flanges = parentsFirst(source.flanges).map((flange): FlangeWork => ({ ...flange, bend: resolveBend(flange.entry, document, material, context) }));
  const entries = new Map(flanges.map((flange) => [flange.entry.id, flange]));
  const childrenOf = (id: string) => flanges.filter(({ entry }) => entry.on === id);
  const problems: FieldProblem[] = [...checkFaceLengths(source, flanges, dimension, thickness, units)];
  if (problems.length > 0) return fail(problems);

  const drawn = drawnBase(source.base, dimension);
  const plane = planeOutline(drawn, edgeCutsOf(drawn, childrenOf("base"), thickness));
  if (!plane) return fail([{ path: source.basePath, message: "the bends on its edges leave nothing of the base, or cut it in pieces; make the base larger or the flanges shorter along its edges" }]);
  const works = new Map<string, FaceWork>([["base", { id: "base", index: 0, drawn, plane, placement: { origin: [0, 0], along: [1, 0] } }]]);
  const bends: Bend[] = [];
  for (const flange of flanges) {
    const parent = works.get(flange.entry.on);
    if (!parent) continue;
    const placed = placeFlange({ parent, flange, children: childrenOf(flange.entry.id), dimension: flange.entry.dimension ?? dimension, thickness, units, index: works.size });
    if (!placed.ok) {
      problems.push(placed.error);
      continue;
    }
    works.set(flange.entry.id, placed.value.face);
    bends.push(placed.value.bend);
  }
  if (problems.length > 0) return fail(problems);
  const faces = [...works.values()].map((work): Face => ({
    id: work.id,
    outline: work.plane.map((p) => placeOnSheet(work.placement, p)),
    holes: [],
    holeContours: [],
    bend: work.index === 0 ? null : work.index - 1,
  }));
  const holes = sheetHoles({ faces, bends }, () => developedOutline({ faces, bends }), [...works.values()].flatMap((work) => holesOf(work, source, entries.get(work.id))));
  if (holes.problems.length > 0) return fail(holes.problems);
  const circles = [...works.values()].flatMap(({ drawn: { circles: local }, placement }) =>
    local.map(({ centre, radius }) => ({ centre: placeOnSheet(placement, centre), radius })));
  return ok({ faces: holes.faces, bends, holesAcross: holes.across, circles, drawnFlat: null });
}

/** The holes that were drawn on a face, laid into the sheet; a flange's own plane is turned over on the way. */
function holesOf({ index, placement }: FaceWork, source: PartSource, flange: FlangeWork | undefined): readonly SheetHole[] {
  const place = ([x, y]: Vec2) => placeOnSheet(placement, flange ? [x, -y] : [x, y]);
  return ((flange ? flange.entry.holes : source.base.holes) ?? []).map((hole, i): SheetHole => {
    const points = holeAsChords(hole).map(place);
    return {
      path: `${flange ? flange.path : "base"}.holes[${i}]`,
      outline: flange ? points.reverse() : points,
      contour: holeContour(hole, place, flange !== undefined),
      face: index,
    };
  });
}
