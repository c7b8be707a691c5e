import { mm, type Mm } from "../core/units";
import { deductionFor } from "./deductionFor";
import type { ShopQuestion } from "./shopAnswer";
import type { ShopCell } from "./shopCell";
import type { ShopPoint } from "./shopPoint";

/**
 * Cells of one place that differ by the punch alone, as one: means by number of trials; the scatter is that within the cells and between
 * them together. They share one radius, since only cells whose radius follows from the V come together.
 */
export function pooled(cells: readonly ShopCell[], question: ShopQuestion): ShopPoint | undefined {
  const valued = cells.flatMap(({ value, ...cell }) => (value === null ? [] : [{ cell, value }]));
  const [first] = valued;
  if (!first) return undefined;
  const count = valued.reduce((sum, { value }) => sum + value.count, 0);
  const k = valued.reduce((sum, { value }) => sum + value.count * value.k, 0) / count;
  const squares = valued.reduce((sum, { value }) => sum + (value.count - 1) * (value.spreadK ?? 0) ** 2 + value.count * (value.k - k) ** 2, 0);
  const spreadK = count < 2 ? null : Math.sqrt(squares / (count - 1));
  const instruments = valued.reduce((sum, { value }) => sum + value.count * value.instrumentsK, 0) / count;
  const perK = question.angle * question.thickness;
  const { thickness, vOpening, angle, radius } = first.cell;
  return {
    k,
    radius,
    deduction: deductionFor(k, radius, question),
    variance: perK ** 2 * ((spreadK ?? 0) ** 2 / count + instruments ** 2),
    spread: spreadK === null ? null : mm(perK * spreadK),
    places: [{
      thickness, vOpening, angle, count, weight: 1,
      punchRadii: valued.map(({ cell }) => cell.punchRadius).sort((a: Mm, b: Mm) => a - b),
      lastMeasured: valued.reduce((last, { value }) => (value.lastMeasured > last ? value.lastMeasured : last), ""),
    }],
  };
}
