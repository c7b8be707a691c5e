/** "bend front", "bends front and back", "bends a, b and 3 more": who it is about. */
export function named(one: string, ids: readonly string[]): string {
  const first = ids[0];
  if (first === undefined) return one;
  if (ids.length === 1) return `${one} ${first}`;
  if (ids.length <= 4) return `${one}s ${ids.slice(0, -1).join(", ")} and ${ids[ids.length - 1] ?? ""}`;
  return `${one}s ${ids.slice(0, 3).join(", ")} and ${ids.length - 3} more`;
}
