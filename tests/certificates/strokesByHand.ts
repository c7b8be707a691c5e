import type { CertificateMove } from "./certificate";
import type { Bend, PartModel } from "@/bending/part/partModel";

/** mm, and radians: bends this near to each other on one line, of one angle and one radius, can be one stroke. */
const [SAME_MM, SAME_RAD] = [0.01, 2e-5];

/**
 * Every stroke that a part allows, from its drawing alone: each bend with either face in front, and bends on one line of one face together.
 * Null for a part with hems or offsets, whose strokes are more than that.
 */
export function strokesByHand(part: PartModel): readonly CertificateMove[] | null {
  if (part.bends.some((bend) => bend.hem !== null || ("strokeWith" in bend && bend.strokeWith))) return null;
  const together = part.bends.map((bend, index) => part.bends.flatMap((other, i) => (i === index || oneLine(bend, other) ? [i] : [])));
  const groups = [...together, ...part.bends.map((_, i) => [i])];
  const found = new Map<string, CertificateMove>();
  for (const group of groups) {
    const mask = group.reduce((bits, bend) => bits | (1 << bend), 0);
    const bend = part.bends[group[0] ?? -1];
    if (bend === undefined) continue;
    const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
    const away = [childStart[0] + childEnd[0] - parentStart[0] - parentEnd[0], childStart[1] + childEnd[1] - parentStart[1] - parentEnd[1]] as const;
    for (const [front, sign] of [[bend.parent, 1], [bend.child, -1]] as const) {
      const heading = ((Math.atan2(sign * away[1], sign * away[0]) * 180) / Math.PI + 360) % 360;
      found.set(`${mask}/${sign}`, { mask, front: part.faces[front]?.id ?? "", up: bend.direction === "up" ? 1 : -1, heading });
    }
  }
  return [...found.values()];
}

function oneLine(a: Bend, b: Bend): boolean {
  if (a.parent !== b.parent || a.direction !== b.direction || Math.abs(a.angle - b.angle) > SAME_RAD) return false;
  if (Math.abs(a.insideRadius - b.insideRadius) > SAME_MM || Math.abs(a.allowance - b.allowance) > SAME_MM) return false;
  const [[ax, ay], [bx, by]] = a.line;
  const length = Math.hypot(bx - ax, by - ay);
  const off = ([x, y]: readonly [number, number]) => Math.abs((x - ax) * (by - ay) - (y - ay) * (bx - ax)) / length;
  const along = (b.line[1][0] - b.line[0][0]) * (bx - ax) + (b.line[1][1] - b.line[0][1]) * (by - ay);
  return along > 0 && b.line.every((p) => off(p) < SAME_MM);
}
