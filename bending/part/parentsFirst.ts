import type { SourceFlange } from "./partSource";

/** The flanges so that each stands after the one it hangs on; otherwise in the document's order. */
export function parentsFirst(flanges: readonly SourceFlange[]): readonly SourceFlange[] {
  const placed = new Set(["base"]);
  const ordered: SourceFlange[] = [];
  let waiting = flanges;
  while (waiting.length > 0) {
    const ready = waiting.filter(({ entry }) => placed.has(entry.on));
    if (ready.length === 0) break;
    const next = ready[0];
    if (!next) break;
    ordered.push(next);
    placed.add(next.entry.id);
    waiting = waiting.filter((flange) => flange !== next);
  }
  return ordered;
}
