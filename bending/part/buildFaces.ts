import { mm, type LengthUnit } from "../core/units";
import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { MaterialFacts } from "../handbook/material";
import type { BendContext } from "./bendContext";
import { checkFaceLengths } from "./checkFaceLengths";
import { drawnBase } from "./drawnBase";
import { edgeCutsOf } from "./edgeCutsOf";
import type { FaceWork, FlangeWork } from "./faceWork";
import { faceHoles } from "./faceHoles";
import { parentsFirst } from "./parentsFirst";
import type { PartDocument } from "./partDocument";
import type { Bend, Face, PartModel } from "./partModel";
import type { PartSource } from "./partSource";
import { placeFlange } from "./placeFlange";
import { placeOnSheet } from "./sheetPlacement";
import { planeOutline } from "./planeOutline";
import { resolveBend } from "./resolveBend";

/**
 * Base and flanges as faces and bends of the unfolded sheet, parents first. A flange whose parent failed is
 * left out, so that each problem is told once, where it begins.
 */
export function buildFaces(
  source: PartSource, document: PartDocument, units: LengthUnit, material: MaterialFacts, context: BendContext,
): Result<Pick<PartModel, "faces" | "bends">, readonly FieldProblem[]> {
  const thickness = mm(document.thickness);
  const dimension = document.dimension ?? "outside";
  const flanges = parentsFirst(source.flanges).map((flange): FlangeWork => ({ ...flange, bend: resolveBend(flange.entry, document, material, context) }));
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
  const faces = [...works.values()].map((work): Face => {
    const flange = flanges.find(({ entry }) => entry.id === work.id);
    const holes = faceHoles(work, flange ? flange.entry.holes : source.base.holes, flange ? `${flange.path}.holes` : "base.holes", flange !== undefined);
    problems.push(...holes.problems);
    return {
      id: work.id,
      outline: work.plane.map((p) => placeOnSheet(work.placement, p)),
      holes: holes.outlines.map((hole) => hole.map((p) => placeOnSheet(work.placement, p))),
      bend: work.index === 0 ? null : work.index - 1,
    };
  });
  return problems.length > 0 ? fail(problems) : ok({ faces, bends });
}
