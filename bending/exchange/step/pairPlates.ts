import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { FacingPlanes } from "./facingPlanes";

/** For each plane face of a sheet, the face on its other side: the pairs that cover one another best. */
export function pairPlates(planes: readonly FacingPlanes[], thickness: number): ReadonlyMap<number, number> {
  const other = new Map<number, number>();
  const fitting = planes.filter(({ distance }) => Math.abs(distance - thickness) <= SOLID_MATCH_MM);
  for (const { a, b } of [...fitting].sort((p, q) => q.cover * q.area - p.cover * p.area)) {
    if (other.has(a) || other.has(b)) continue;
    other.set(a, b);
    other.set(b, a);
  }
  return other;
}
