import { mm } from "../core/units";
import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { MaterialFacts, MaterialLookup } from "../handbook/material";
import type { BendContext } from "./bendContext";
import { buildFaces } from "./buildFaces";
import { buildFlat } from "./flat/buildFlat";
import { checkPartDocument } from "./checkPartDocument";
import { documentInUnits } from "./documentInUnits";
import { overlapProblems } from "./overlapProblems";
import type { PartDocument } from "./partDocument";
import type { PartModel, PartShape } from "./partModel";
import { partSource } from "./partSource";
import { unknownMaterial } from "./unknownMaterial";

export interface BuildPartOptions extends BendContext {
  readonly materials: MaterialLookup;
  /** The ids that `materials` knows, to list them when one is not known. */
  readonly knownMaterials?: readonly string[];
  /** Give the part even when its flat overlaps, so that `flatOverlaps` can show where. */
  readonly keepOverlaps?: boolean;
}

/**
 * The part that a document describes, made ready for computing: plane faces and bends in the unfolded sheet,
 * or what has to be mended, field by field and in the document's units.
 */
export function buildPart(document: PartDocument, options: BuildPartOptions): Result<PartModel, readonly FieldProblem[]> {
  const material = options.materials(document.material);
  const early = [...checkPartDocument(document), ...(material ? [] : [unknownMaterial(document.material, options.knownMaterials)])];
  if (early.length > 0 || !material) return fail(early);
  const built = buildShape(document, material, options);
  if (!built.ok) return built;
  const { thickness, toleranceLength } = documentInUnits(document, "mm");
  const part: PartModel = { name: document.name, thickness: mm(thickness), material, toleranceLength: toleranceLength === undefined ? null : mm(toleranceLength), ...built.value };
  const overlaps = options.keepOverlaps ? [] : overlapProblems(part, document);
  return overlaps.length > 0 ? fail(overlaps) : ok(part);
}

function buildShape(document: PartDocument, material: MaterialFacts, context: BendContext): Result<PartShape, readonly FieldProblem[]> {
  const inMm = documentInUnits(document, "mm");
  if (inMm.flat) return buildFlat(inMm.flat, inMm, document.units, material, context);
  const source = partSource(inMm);
  return buildFaces(source, inMm, document.units, material, context);
}
