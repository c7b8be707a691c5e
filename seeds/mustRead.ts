import { invariant } from "@/bending/core/invariant";
import type { Result } from "@/bending/core/result";

/** The shop's own documents are right, or the program is wrong. */
export function mustRead<T>(what: string, result: Result<T, unknown>): T {
  if (!result.ok) invariant(false, `the demonstration's ${what} is refused: ${JSON.stringify(result.error)}`);
  return result.value;
}
