import type { PartModel } from "@/bending/part/partModel";

/** mm. The shorter of the two sides that make an angle, each measured away from the bend line. */
export function shorterSide(part: PartModel, bendIndex: number): number {
  const bend = part.bends[bendIndex];
  if (!bend) return 0;
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay) || 1;
  const reach = (face: number): number =>
    Math.max(0, ...(part.faces[face]?.outline ?? []).map(([x, y]) => Math.abs(((bx - ax) * (y - ay) - (by - ay) * (x - ax)) / length)));
  return Math.min(reach(bend.parent), reach(bend.child));
}
