import type { PlanTolerance } from "./planTolerance";

/** A dimension as people read it: "front, bend to far edge", "base, left to right", "over all, left to right". */
export function toleranceName({ kind, face, from, to, across }: Pick<PlanTolerance, "kind" | "face" | "from" | "to" | "across">): string {
  if (kind === "overall") return across ? `over all, square to ${face}` : `over all, ${from} to ${to}`;
  const end = kind === "hole" ? "nearest hole" : to.startsWith("edge ") ? "far edge" : to;
  return `${face}, ${from === face ? "bend" : from} to ${end}`;
}
