import { invariant } from "@/bending/core/invariant";

/** What was written a moment ago and is read back. */
export function foundAgain<T>(found: T | undefined): T {
  invariant(found !== undefined, "what was just written can be read");
  return found;
}
