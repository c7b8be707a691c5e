import { invalid } from "../invalid";
import { unstorable } from "../unstorable";
import { fail, ok, type Result } from "@/bending/core/result";
import type { LengthUnit } from "@/bending/core/units";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import type { Tool } from "@/bending/tooling/tool";
import type { Failure } from "@/lib/api/failure";

/** One tool as an entry of a tooling document, without its pieces; the paths of problems are the request's own. */
export function readToolEntry(entry: Readonly<Record<string, unknown>>, units: LengthUnit): Result<Tool, Failure> {
  const given = Object.fromEntries(Object.entries(entry).filter(([, value]) => value !== undefined));
  const problems = unstorable(given);
  const read = problems.length > 0 ? fail(problems) : readToolingDocument({ format: "tooling/1", units, tools: [{ ...given, sections: [] }] });
  const tool = read.ok ? read.value[0] : undefined;
  if (tool) return ok(tool);
  const errors = (read.ok ? [] : read.error).map(({ path, message }) => ({ path: ownPath(path), message }));
  return fail(invalid("The tool cannot be used as described. Nothing was saved.", errors));
}

const ownPath = (path: string): string => path.replace(/^tools\[0\]\.?/, "").replace(/^id$/, "code");
