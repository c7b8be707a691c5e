/** Throws when the program itself is wrong (never for bad input). */
export function invariant(condition: unknown, message: string): asserts condition {
  if (!condition) throw new Error(`invariant: ${message}`);
}
