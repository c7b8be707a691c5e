import type { FieldProblem } from "../core/problem";
import { builtInMaterials } from "../handbook/materials";

export function unknownMaterial(id: string, known: readonly string[] = builtInMaterials.map((material) => material.id)): FieldProblem {
  return { path: "material", message: `"${id}" is not known; it must be one of: ${known.join(", ")}` };
}
