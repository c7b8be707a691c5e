/** A plan's cost as a function of one setting: rest + slope x value. */
export interface CostLine { readonly slope: number; readonly rest: number }

export type EnvelopeEnd<L extends CostLine> =
  | { readonly kind: "kept" }
  | { readonly kind: "taken over"; /** The value at which both cost the same. */ readonly at: number; readonly by: L }
  | { readonly kind: "open" };

/** Seconds. Costs nearer than this are equal: they are kept to a millionth. */
const SAME_COST = 1e-4;
/** Lines that are crossed on the way; each step leaves one behind for good. */
const MOST_LINES = 24;

/**
 * How far from `from` towards `to` a line stays the least of all, all lines known only by asking for the least one at a value (`least`; null: not known). The
 * least line at the far end is crossed with the line itself, the least there is asked for, and so on till nothing is under the crossing (Eisner and Severance 1976).
 */
export function lowerEnvelopeEnd<L extends CostLine>(own: CostLine, least: (value: number) => L | null, from: number, to: number): EnvelopeEnd<L> {
  let [value, by]: [number, L | null] = [to, null];
  for (let crossed = 0; crossed < MOST_LINES; crossed += 1) {
    const found = least(value);
    if (found === null) return { kind: "open" };
    if (costAt(own, value) <= costAt(found, value) + SAME_COST) return by === null ? { kind: "kept" } : { kind: "taken over", at: value, by };
    by = found;
    const crossing = (found.rest - own.rest) / (own.slope - found.slope);
    value = to > from ? Math.max(from, Math.min(value, crossing)) : Math.min(from, Math.max(value, crossing));
  }
  return { kind: "open" };
}

const costAt = ({ slope, rest }: CostLine, value: number) => rest + slope * value;
