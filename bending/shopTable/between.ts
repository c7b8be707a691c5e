import { mm } from "../core/units";
import { deductionFor } from "./deductionFor";
import type { ShopQuestion } from "./shopAnswer";
import type { ShopCell } from "./shopCell";
import type { ShopPoint } from "./shopPoint";

/** The place asked for along one axis: what counts as just there, and whether two neighbours are near enough. */
export interface Along {
  readonly at: number;
  readonly same: (value: number) => boolean;
  readonly reach: (low: number, high: number) => boolean;
}

/** The value at a place along one axis: of the cells just there, else in proportion between the nearest on both sides that have one. */
export function between(cells: readonly ShopCell[], axis: (cell: ShopCell) => number, along: Along, question: ShopQuestion, pick: (cells: readonly ShopCell[]) => ShopPoint | undefined): ShopPoint | undefined {
  const { at, same, reach } = along;
  const values = [...new Set(cells.map(axis))].sort((a, b) => a - b);
  const pointAt = (value: number) => pick(cells.filter((cell) => axis(cell) === value));
  const nearestFirst = (a: number, b: number) => Math.abs(a - at) - Math.abs(b - at) || a - b;
  for (const value of values.filter(same).sort(nearestFirst)) {
    const point = pointAt(value);
    if (point) return point;
  }
  const low = firstPoint(values.filter((value) => value < at).reverse(), pointAt);
  const high = firstPoint(values.filter((value) => value > at), pointAt);
  if (!low || !high || !reach(low.value, high.value)) return undefined;
  return blend(low.point, high.point, (at - low.value) / (high.value - low.value), question);
}

function firstPoint(values: readonly number[], pointAt: (value: number) => ShopPoint | undefined): { readonly value: number; readonly point: ShopPoint } | undefined {
  for (const value of values) {
    const point = pointAt(value);
    if (point) return { value, point };
  }
  return undefined;
}

/**
 * In proportion between two. The uncertainty is that of both in proportion, and what the neighbours differ by: the truth may lie
 * anywhere between them, a rectangular distribution of half that width, u = difference / (2 sqrt 3) (JCGM 100:2008, 4.3.7).
 */
function blend(low: ShopPoint, high: ShopPoint, part: number, question: ShopQuestion): ShopPoint {
  const mix = (a: number, b: number) => a + (b - a) * part;
  const [k, radius] = [mix(low.k, high.k), mm(mix(low.radius, high.radius))];
  const apart = high.deduction - low.deduction;
  return {
    k,
    radius,
    deduction: deductionFor(k, radius, question),
    variance: (1 - part) ** 2 * low.variance + part ** 2 * high.variance + apart ** 2 / 12,
    spread: low.spread === null && high.spread === null ? null : mm(Math.max(low.spread ?? 0, high.spread ?? 0)),
    places: [
      ...low.places.map((place) => ({ ...place, weight: place.weight * (1 - part) })),
      ...high.places.map((place) => ({ ...place, weight: place.weight * part })),
    ],
  };
}
