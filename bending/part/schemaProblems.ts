import type { z } from "zod";
import type { FieldProblem } from "../core/problem";

/** What the schema refused, in words for a person and with the path written as in `flanges[2].length`. */
export function schemaProblems(error: z.ZodError): readonly FieldProblem[] {
  return error.issues.flatMap((issue) => {
    const path = fieldPath(issue.path);
    if (issue.code === "unrecognized_keys") {
      return issue.keys.map((key) => ({
        path: path ? `${path}.${key}` : key,
        message: "is not a field of a part document",
      }));
    }
    return [{ path, message: message(issue) }];
  });
}

function fieldPath(path: readonly PropertyKey[]): string {
  return path.reduce<string>((text, key) => (typeof key === "number" ? `${text}[${key}]` : text ? `${text}.${String(key)}` : String(key)), "");
}

function message(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case "invalid_type":
      return written(issue.message) ?? (issue.input === undefined ? "is missing" : `must be ${EXPECTED[issue.expected] ?? issue.expected}`);
    case "invalid_value":
      return `must be ${issue.values.map((value) => JSON.stringify(value)).join(" or ")}`;
    case "too_small":
      return written(issue.message) ?? `must be ${issue.inclusive ? "at least" : "more than"} ${issue.minimum}`;
    case "too_big":
      return written(issue.message) ?? `must be at most ${issue.maximum}${issue.origin === "string" ? " characters" : issue.origin === "array" ? " entries" : ""}`;
    default:
      return written(issue.message) ?? "is not right";
  }
}

const EXPECTED: Readonly<Record<string, string>> = {
  number: "a finite number",
  string: "text",
  array: "a list",
  object: "an object",
  tuple: "a list of the right length",
  int: "a whole number",
};

/** The schema's own sentence; the package's default sentences begin with a capital. */
const written = (text: string): string | undefined => (/^[a-z]/.test(text) ? text : undefined);
