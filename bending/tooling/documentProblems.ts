import type { z } from "zod";
import type { FieldProblem } from "../core/problem";

/** What a schema found, field by field, in words: where it is and what would be right. */
export function documentProblems(error: z.ZodError): readonly FieldProblem[] {
  return error.issues.flatMap((issue): readonly FieldProblem[] => {
    if (issue.code === "unrecognized_keys") {
      return issue.keys.map((key) => ({ path: pathText([...issue.path, key]), message: `"${key}" is not a field here; take it out or mend its spelling` }));
    }
    return [{ path: pathText(issue.path), message: issue.message }];
  });
}

function pathText(path: readonly PropertyKey[]): string {
  let text = "";
  for (const key of path) text += typeof key === "number" ? `[${key}]` : text === "" ? String(key) : `.${String(key)}`;
  return text;
}
