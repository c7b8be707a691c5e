import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { documentProblems } from "./documentProblems";
import { readTool } from "./readTool";
import type { Tool } from "./tool";
import { toolingSchema } from "./toolingSchema";

/** The tools of a tooling document (`tooling/1`), or every field that keeps it from being read. */
export function readToolingDocument(json: unknown): Result<readonly Tool[], readonly FieldProblem[]> {
  const read = toolingSchema.safeParse(json);
  if (!read.success) return fail(documentProblems(read.error));
  const tools: Tool[] = [];
  const problems: FieldProblem[] = [];
  const ids = new Set<string>();
  read.data.tools.forEach((entry, i) => {
    const tool = readTool(entry, `tools[${i}]`, read.data.units);
    if (!tool.ok) problems.push(...tool.error);
    else if (ids.has(tool.value.id)) problems.push({ path: `tools[${i}].id`, message: `"${tool.value.id}" stands on two tools; each tool needs its own` });
    else tools.push(tool.value);
    ids.add(entry.id);
  });
  return problems.length ? fail(problems) : ok(tools);
}
