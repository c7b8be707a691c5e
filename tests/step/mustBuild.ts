import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";

/** A document's part with the built-in materials; a test that gives a wrong document fails here. */
export function mustBuild(document: PartDocument): PartModel {
  const built = buildPart(document, { materials: materialById });
  if (!built.ok) throw new Error(JSON.stringify(built.error));
  return built.value;
}
