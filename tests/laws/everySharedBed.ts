import type { Interval } from "@/bending/geometry/interval";
import { freeShifts } from "@/bending/setup/freeShifts";
import type { SharedWish } from "@/bending/setup/shared/sharedWish";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";

const HEIGHT_TOLERANCE = 0.1;
const HAND = 100;
const SHORTEST = 5;
/** Half millimetres: every end of the made-up cases is a whole number, so that turning points lie on these. */
const STEP = 0.5;

interface Made { readonly punch: Tool; readonly die: Tool; readonly above: number; readonly below: number; readonly pieces: number; readonly carried: number; readonly length: number }

/**
 * The best bed by trying everything: every division of the wishes into stations, every pair for each, every set of
 * pieces, every length they can be drawn apart to. Rank as one number: stations, kinds, pieces, length; infinite for none.
 */
export function everySharedBed(wishes: readonly SharedWish[], stock: readonly Tool[], machine: Machine): number {
  let best = Infinity;
  for (const groups of divisions(wishes)) {
    const options = groups.map((group) => everyStation(group, stock, machine));
    const choose = (at: number, chosen: readonly Made[]): void => {
      const next = options[at];
      if (next === undefined) {
        const length = chosen.reduce((sum, one) => sum + one.length, 0) + HAND * (chosen.length - 1);
        if (length > machine.bedLength + 1e-6) return;
        const kinds = new Set(chosen.flatMap(({ punch, die }) => [punch, die])).size;
        const [pieces, carried] = [chosen.reduce((sum, one) => sum + one.pieces, 0), chosen.reduce((sum, one) => sum + one.carried, 0)];
        best = Math.min(best, ((chosen.length * 100 + kinds) * 100 + pieces) * 1e5 + carried);
        return;
      }
      for (const one of next) {
        const shares = chosen.some((other) => (other.punch === one.punch && (other.above & one.above)) || (other.die === one.die && (other.below & one.below)));
        const height = ({ punch, die }: Made) => punch.height + die.height;
        if (!shares && chosen.every((other) => Math.abs(height(other) - height(one)) <= HEIGHT_TOLERANCE)) choose(at + 1, [...chosen, one]);
      }
    };
    if (groups.length * 1e9 < best || best === Infinity) choose(0, []);
  }
  return best;
}

function divisions<T>(items: readonly T[]): readonly (readonly (readonly T[])[])[] {
  const [first, ...rest] = items;
  if (first === undefined) return [[]];
  return divisions(rest).flatMap((groups) => [[[first], ...groups], ...groups.map((group, index) => groups.map((other, at) => (at === index ? [first, ...group] : other)))]);
}

function everyStation(group: readonly SharedWish[], stock: readonly Tool[], { settings, bedLength }: Machine): readonly Made[] {
  const made: Made[] = [];
  for (const punch of stock.filter(({ kind }) => kind === "punch")) {
    for (const die of stock.filter(({ kind }) => kind === "die")) {
      if (!group.every(({ ways }) => ways.some((way) => way.punch === punch.id && way.die === die.id))) continue;
      for (let above = 1; above < 2 ** punch.pieces.length; above += 1) {
        for (let below = 1; below < 2 ** die.pieces.length; below += 1) {
          const [p, d] = [sumOf(punch, above), sumOf(die, below)];
          const length = Math.min(...spread(p, settings.maxSectionGap).flatMap((punchLength) => spread(d, settings.maxSectionGap).flatMap((dieLength) =>
            (group.every((wish) => holds(wish, punch.id, die.id, punchLength, dieLength, settings.maxUncoveredEnd)) ? [Math.max(punchLength, dieLength)] : []))));
          if (length <= bedLength) made.push({ punch, die, above, below, pieces: p.count + d.count, carried: p.sum + d.sum, length });
        }
      }
    }
  }
  return made;
}

function sumOf({ pieces }: Tool, mask: number) {
  const chosen = pieces.filter((_, index) => (mask >> index) & 1);
  return { sum: chosen.reduce((total, { length }) => total + length, 0), count: chosen.length };
}

const spread = ({ sum, count }: { readonly sum: number; readonly count: number }, gap: number) =>
  Array.from({ length: Math.round(((count - 1) * gap) / STEP) + 1 }, (_, index) => sum + index * STEP);

function holds({ lineLength, ways }: SharedWish, punch: string, die: string, punchLength: number, dieLength: number, uncovered: number): boolean {
  if (Math.min(punchLength, dieLength) < SHORTEST) return false;
  const reach = Math.min(punchLength, dieLength) / 2 - lineLength / 2 + uncovered;
  const outside = ([from, to]: Interval): readonly Interval[] => [[-1e6, from], [to, 1e6]];
  return ways.some((way) => way.punch === punch && way.die === die && freeShifts(reach, [
    { offset: 0, length: punchLength, forbidden: outside(way.punchWindow) }, { offset: 0, length: dieLength, forbidden: outside(way.dieWindow) },
  ]).length > 0);
}
