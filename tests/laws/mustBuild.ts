import { buildPart, materialById, readPartDocument, type PartDocument, type PartModel } from "@/bending";

/** The part of a document that has to be right; otherwise the problems are thrown for the test to show. */
export function mustBuild(document: PartDocument): PartModel {
  const read = readPartDocument(JSON.parse(JSON.stringify(document)));
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  const built = buildPart(read.value, { materials: materialById });
  if (!built.ok) throw new Error(JSON.stringify(built.error));
  return built.value;
}
