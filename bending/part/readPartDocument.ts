import { fail, ok, type Result } from "../core/result";
import type { FieldProblem } from "../core/problem";
import { checkPartDocument } from "./checkPartDocument";
import type { PartDocument } from "./partDocument";
import { partSchema } from "./partSchema";
import { schemaProblems } from "./schemaProblems";

/**
 * A part document out of unknown JSON: its fields, its outlines and its tree of flanges. What depends on the
 * material (radii, setbacks, whether a leg is long enough) is found by `buildPart`.
 */
export function readPartDocument(json: unknown): Result<PartDocument, readonly FieldProblem[]> {
  const parsed = partSchema.safeParse(json, { reportInput: true });
  if (!parsed.success) return fail(schemaProblems(parsed.error));
  const { profile, base, flanges, flat } = parsed.data;
  const shapes = [profile, base, flat].filter((shape) => shape !== undefined).length;
  if (shapes !== 1) return fail([{ path: "", message: "must hold exactly one of: profile, base (with flanges), flat" }]);
  if (flanges && !base) return fail([{ path: "flanges", message: "belong to a base; a profile or a flat has its bends inside" }]);
  // Optional fields that a form left undefined are dropped: from here on a field is there or it is not.
  const document = JSON.parse(JSON.stringify(parsed.data)) as PartDocument;
  const problems = checkPartDocument(document);
  return problems.length > 0 ? fail(problems) : ok(document);
}
