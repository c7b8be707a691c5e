import type { FieldProblem } from "@/bending/core/problem";

const LONGEST_TEXT = 2000;
const DEEPEST = 40;

/**
 * Texts in a JSON value that the database cannot hold (a NUL, half of a surrogate pair) or that no field is meant for
 * (over 2000 characters), and nesting that no document has; names of keys included. At most ten are named.
 */
export function unstorable(json: unknown, path = ""): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  const visit = (value: unknown, at: string, depth: number): void => {
    if (problems.length >= 10) return;
    if (typeof value === "string") problems.push(...faultOf(value).map((message) => ({ path: at, message })));
    if (typeof value !== "object" || value === null) return;
    if (depth === DEEPEST) {
      problems.push({ path: at, message: `is nested deeper than ${DEEPEST} levels` });
      return;
    }
    for (const [key, entry] of Object.entries(value)) {
      const name = Array.isArray(value) ? `${at}[${key}]` : at === "" ? key.slice(0, 60) : `${at}.${key.slice(0, 60)}`;
      if (!Array.isArray(value) && faultOf(key).length > 0) problems.push({ path: at, message: "has a field whose name contains characters that cannot be stored" });
      else visit(entry, name, depth + 1);
    }
  };
  visit(json, path, 0);
  return problems;
}

function faultOf(text: string): readonly string[] {
  if (text.length > LONGEST_TEXT) return [`must be at most ${LONGEST_TEXT} characters`];
  return /[\u0000-\u0008\u000b\u000c\u000e-\u001f]|\p{Cs}/u.test(text) ? ["must not contain control characters"] : [];
}
