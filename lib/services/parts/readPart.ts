import { invalid } from "../invalid";
import { unstorable } from "../unstorable";
import type { FieldProblem } from "@/bending/core/problem";
import { fail, ok, type Result } from "@/bending/core/result";
import type { MaterialLookup } from "@/bending/handbook/material";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern } from "@/bending/part/flatPattern";
import { readPartDocument } from "@/bending/part/readPartDocument";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import type { NewRevision } from "@/db/parts/newRevision";
import type { Failure } from "@/lib/api/failure";

const LONGEST_NAME = 200;

/** Checks a part document through and through, and takes from it what is searched; paths begin with `document`. */
export function readPart(json: unknown, { materials, table }: { readonly materials: MaterialLookup; readonly table: ShopTable }): Result<Omit<NewRevision, "note" | "by">, Failure> {
  const problems = unstorable(json);
  if (problems.length > 0) return refuse(problems);
  const document = readPartDocument(json);
  if (!document.ok) return refuse(document.error);
  const { name, material } = document.value;
  if (name.length > LONGEST_NAME) return refuse([{ path: "name", message: `must be at most ${LONGEST_NAME} characters` }]);
  const part = buildPart(document.value, { materials, shopTable: table });
  if (!part.ok) return refuse(part.error);
  const flat = flatPattern(part.value);
  return ok({
    document: document.value,
    name,
    materialId: material,
    thicknessMm: part.value.thickness,
    flatWidthMm: flat.width,
    flatDepthMm: flat.depth,
    bends: part.value.bends.length,
  });
}

const refuse = (problems: readonly FieldProblem[]) =>
  fail(invalid("The part cannot be made as described. Nothing was saved.", problems, "document"));
