import { fail, ok, type Result } from "../core/result";
import type { FieldProblem } from "../core/problem";
import type { CommandWorld } from "./outcome";

/** Largest document taken, in characters: far above real ones. */
const MOST_CHARACTERS = 10_000_000;

/** Reads a document; the message of a failure names the file and the field. */
export function readJsonFile<T>(world: CommandWorld, path: string, read: (json: unknown) => Result<T, readonly FieldProblem[]>): Result<T, string> {
  const text = world.readText(path);
  if (!text.ok) return fail(`${path}: ${text.error}`);
  if (text.value.length > MOST_CHARACTERS) return fail(`${path}: the file is larger than ${MOST_CHARACTERS / 1e6} MB`);
  let json: unknown;
  try {
    json = JSON.parse(text.value.replace(/^\uFEFF/, ""));
  } catch (error) {
    return fail(`${path}: not JSON (${error instanceof Error ? error.message : "unreadable"})`);
  }
  const found = read(json);
  if (found.ok) return ok(found.value);
  return fail(problemLine(path, found.error));
}

/** The first problem in full, and how many more there are. */
export function problemLine(path: string, problems: readonly FieldProblem[]): string {
  const first = problems[0];
  const more = problems.length > 1 ? ` (and ${problems.length - 1} more: ${problems.slice(1, 6).map((problem) => problem.path).join(", ")})` : "";
  return `${path}: ${first ? `${first.path || "document"}: ${first.message}` : "not a document"}${more}`;
}
