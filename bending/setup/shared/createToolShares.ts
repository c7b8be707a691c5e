import type { Interval } from "../../geometry/interval";
import { carryCost } from "./carryCost";
import type { PieceStock } from "./createPieceStock";
import { pieceChoices, type PieceChoice } from "./pieceChoices";
import type { SearchEffort } from "./searchEffort";

/** Pieces of one tool for several runs at once, in the order of the runs. */
export interface ToolShare {
  readonly cost: number;
  readonly choices: readonly PieceChoice[];
}

/** The cheapest way to give runs of these lengths their pieces out of one tool's stock; null when there is none, or the effort is spent. */
export type ToolShares = (tool: number, spans: readonly Interval[]) => ToolShare | null;

interface Chain { readonly cost: number; readonly choice: PieceChoice | null; readonly next: Chain | null }

/** Exact, by the cheapest rest for every count of pieces that is left, each worked out once; runs with the fewest choices first. */
export function createToolShares(stocks: readonly PieceStock[], maxGap: number, effort: SearchEffort): ToolShares {
  const known = new Map<string, ToolShare | null>();
  const makers = stocks.map((stock) => createShare(stock, maxGap, effort));
  return (tool, spans) => {
    const turn = spans.map((_, index) => index).sort((a, b) => (spans[a]?.[0] ?? 0) - (spans[b]?.[0] ?? 0) || (spans[a]?.[1] ?? 0) - (spans[b]?.[1] ?? 0));
    const sorted = turn.flatMap((index) => (spans[index] ? [spans[index]] : []));
    const key = `${tool}:${sorted.map((span) => span.join()).join(";")}`;
    const found = known.get(key) ?? (known.has(key) ? null : makers[tool]?.(sorted) ?? null);
    known.set(key, found);
    if (found === null) return null;
    const choices: PieceChoice[] = [];
    turn.forEach((index, at) => { const choice = found.choices[at]; if (choice) choices[index] = choice; });
    return { cost: found.cost, choices };
  };
}

function createShare(stock: PieceStock, maxGap: number, effort: SearchEffort): (spans: readonly Interval[]) => ToolShare | null {
  const whole = stock.kinds.map(({ pieces }) => pieces.length);
  const most = whole.reduce((sum, count) => sum + count, 0);
  const choicesOf = new Map<string, readonly PieceChoice[]>();
  const choices = (span: Interval, count: number): readonly PieceChoice[] => {
    const key = `${span.join()}/${count}`;
    const found = choicesOf.get(key) ?? [...pieceChoices(stock, whole, count, span, maxGap)].sort((a, b) => a.length - b.length);
    choicesOf.set(key, found);
    return found;
  };
  const alone = ([least, longest]: Interval) => {
    const sum = stock.sums.find(({ length, apart }) => length <= longest + 1e-6 && apart >= least - 1e-6);
    return sum ? carryCost(sum.count, sum.length) : Infinity;
  };
  return (spans) => {
    const order = spans.map((span, index) => ({ span, index, least: alone(span) })).sort((a, b) => b.least - a.least);
    const rest = order.map((_, at) => order.slice(at).reduce((sum, one) => sum + one.least, 0)).concat(0);
    if (!Number.isFinite(rest[0] ?? 0)) return null;
    const done = order.map(() => new Map<string, Chain | null>());
    const cheapest = (at: number, left: readonly number[]): Chain | null => {
      const one = order[at];
      if (one === undefined) return { cost: 0, choice: null, next: null };
      const key = left.join();
      const answer = done[at]?.get(key);
      if (answer !== undefined) return answer;
      effort.step();
      if (effort.spent()) return null;
      let best: Chain | null = null;
      const after = rest[at + 1] ?? 0;
      const limit = () => best?.cost ?? Infinity;
      for (let count = 1; count <= most && carryCost(count, 0) + after < limit(); count += 1) {
        for (const choice of choices(one.span, count)) {
          const cost = carryCost(count, choice.length);
          if (cost + after >= limit()) break;
          if (choice.counts.some((taken, kind) => taken > (left[kind] ?? 0))) continue;
          const next = cheapest(at + 1, left.map((there, kind) => there - (choice.counts[kind] ?? 0)));
          if (next !== null && cost + next.cost < limit()) best = { cost: cost + next.cost, choice, next };
        }
      }
      done[at]?.set(key, best);
      return best;
    };
    const found = cheapest(0, whole);
    if (found === null) return null;
    const given: PieceChoice[] = [];
    let chain: Chain | null = found;
    for (const { index } of order) {
      if (chain?.choice) given[index] = chain.choice;
      chain = chain?.next ?? null;
    }
    return { cost: found.cost, choices: given };
  };
}
