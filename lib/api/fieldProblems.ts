import type { z } from "zod";
import type { FieldProblem } from "@/bending/core/problem";

/** `flanges[2].length`; the document itself has the path "". */
const pathText = (path: readonly PropertyKey[]): string =>
  path.reduce<string>((text, part) => (typeof part === "number" ? `${text}[${part}]` : text ? `${text}.${String(part)}` : String(part)), "");

/** Zod's findings, one for each field that must change; an unknown key is named itself. */
export function fieldProblems(error: z.ZodError): readonly FieldProblem[] {
  return error.issues.flatMap((issue): readonly FieldProblem[] =>
    issue.code === "unrecognized_keys"
      ? issue.keys.map((key) => ({ path: pathText([...issue.path, key]), message: "is not a field that is known here" }))
      : [{ path: pathText(issue.path), message: issue.message }]);
}
