import type { Hit } from "../clearance/hit";
import { hitSides } from "../clearance/hitSides";
import type { PartModel } from "../part/partModel";

/**
 * How far the sheet lies level on either side of a bend line before the stroke, mm from the line, over faces
 * that are still flat with each other: what the die's shoulders have to hold.
 */
export function sheetReach(part: PartModel, hit: Hit): { readonly front: number; readonly back: number } {
  const bend = part.bends[hit.bends[0] ?? -1];
  if (bend === undefined) return { front: 0, back: 0 };
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay);
  const across = (p: readonly [number, number]) => Math.abs(((p[0] - ax) * (by - ay) - (p[1] - ay) * (bx - ax)) / length);
  const parent = farthest(part, hit, bend.parent, across);
  const child = Math.min(...hit.bends.map((index) => farthest(part, hit, part.bends[index]?.child ?? 0, across)));
  return hitSides(part, hit)[bend.parent] ? { front: parent, back: child } : { front: child, back: parent };
}

/** The farthest point of the faces that hang flat together with this one, without crossing a formed bend or one of the stroke. */
function farthest(part: PartModel, hit: Hit, start: number, across: (p: readonly [number, number]) => number): number {
  const level = new Set([start]);
  const waiting = [start];
  let far = 0;
  for (let face = waiting.pop(); face !== undefined; face = waiting.pop()) {
    for (const p of part.faces[face]?.outline ?? []) far = Math.max(far, across(p));
    part.bends.forEach(({ parent, child }, index) => {
      if ((hit.formed >> index) & 1 || hit.bends.includes(index)) return;
      const next = parent === face ? child : child === face ? parent : null;
      if (next !== null && !level.has(next)) { level.add(next); waiting.push(next); }
    });
  }
  return far;
}
