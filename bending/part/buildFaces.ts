import { mm, type LengthUnit } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { MaterialFacts } from "../handbook/material";
import type { BendContext } from "./bendContext";
import { checkFaceLengths } from "./checkFaceLengths";
import { developedOutline } from "./developedOutline";
import { cornerTrims, type CornerTrims } from "./cornerTrims";
import { drawnBase } from "./drawnBase";
import type { DrawnFace } from "./drawnFace";
import { edgeCutsOf } from "./edgeCutsOf";
import type { FaceWork, FlangeWork } from "./faceWork";
import { holeAsChords } from "./holeAsChords";
import { holeContour } from "./holeContour";
import { parentsFirst } from "./parentsFirst";
import type { PartDocument } from "./partDocument";
import type { Bend, Face, PartShape } from "./partModel";
import type { PartSource } from "./partSource";
import { placeFlange } from "./placeFlange";
import { reliefCircles } from "./reliefCircles";
import { strokePartners } from "./strokePartners";
import { withSteps } from "./withSteps";
import { withZoneCorners } from "./withZoneCorners";
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
  const stepped = withSteps(source.flanges, (entry) => resolveBend(entry, document, material, context).insideRadius, thickness, units);
  if (stepped.problems.length > 0) return fail(stepped.problems);
  const flanges = parentsFirst(stepped.flanges).map((flange): FlangeWork => ({ ...flange, bend: resolveBend(flange.entry, document, material, context) }));
  const entries = new Map(flanges.map((flange) => [flange.entry.id, flange]));
  const children = new Map<string, FlangeWork[]>();
  for (const flange of flanges) children.set(flange.entry.on, [...(children.get(flange.entry.on) ?? []), flange]);
  const childrenOf = (id: string) => children.get(id) ?? [];
  const problems: FieldProblem[] = [...checkFaceLengths(source, flanges, dimension, thickness, units)];
  if (problems.length > 0) return fail(problems);

  const drawn = drawnBase(source.base, dimension);
  const baseCuts = edgeCutsOf(drawn, childrenOf("base"), thickness, document.relief);
  const plane = planeOutline(drawn, baseCuts);
  if (!plane) return fail([{ path: source.basePath, message: "the bends on its edges leave nothing of the base, or cut it in pieces; make the base larger or the flanges shorter along its edges" }]);
  const works = new Map<string, FaceWork>([["base", { id: "base", index: 0, drawn, plane, reliefs: reliefCircles(drawn, baseCuts), alongChain: 0, placement: { origin: [0, 0], along: [1, 0] } }]]);
  const trims = new Map<string, CornerTrims>();
  const trimOn = (id: string, face: DrawnFace) => {
    const found = cornerTrims({ face, flanges: childrenOf(id), childrenOf, dimension, corner: document.corner, thickness });
    found.trims.forEach((line, flange) => trims.set(flange, line));
    problems.push(...found.problems);
  };
  trimOn("base", drawn);
  const bends: Bend[] = [];
  for (const flange of flanges) {
    const parent = works.get(flange.entry.on);
    if (!parent) continue;
    const placed = placeFlange({ parent, flange, children: childrenOf(flange.entry.id), dimension: flange.entry.dimension ?? dimension, thickness, units, index: works.size, relief: document.relief, trims: trims.get(flange.entry.id) ?? { start: null, end: null } });
    if (!placed.ok) {
      problems.push(placed.error);
      continue;
    }
    works.set(flange.entry.id, placed.value.face);
    bends.push(placed.value.bend);
    trimOn(flange.entry.id, placed.value.face.drawn);
  }
  if (problems.length > 0) return fail(problems);
  const faces = withZoneCorners([...works.values()].map((work): Face => ({
    id: work.id,
    outline: work.plane.map((p) => placeOnSheet(work.placement, p)),
    holes: [],
    holeContours: [],
    bend: work.index === 0 ? null : work.index - 1,
  })), bends);
  const paired = strokePartners(bends, new Map(flanges.map(({ entry, path }) => [entry.id, { strokeWith: entry.strokeWith ?? null, path: `${path}.strokeWith` }])));
  if (!paired.ok) return paired;
  const holes = sheetHoles({ faces, bends }, () => developedOutline({ faces, bends }), [...works.values()].flatMap((work) => holesOf(work, source, entries.get(work.id))));
  if (holes.problems.length > 0) return fail(holes.problems);
  const circles = [...works.values()].flatMap(({ drawn, reliefs, placement }) =>
    [...drawn.circles, ...reliefs].map(({ centre, radius }) => ({ centre: placeOnSheet(placement, centre), radius })));
  return ok({ faces: holes.faces, bends: paired.value, holesAcross: holes.across, circles, drawnFlat: null });
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
