import { createGaugeNumbers } from "../../plan/gaugeNumbers";
import type { PlanDocument } from "../../plan/planDocument";
import { relaxedProblem } from "../../plan/relaxedProblem";
import { drawnBend } from "../../strokes/drawnIds";
import type { WhySituation } from "../situationsOf";
import type { WhyFacts } from "../whyFacts";

export interface MovedOrder {
  readonly order: readonly string[];
  /** The entries of the person's order that stand elsewhere in it. */
  readonly strokes: readonly string[];
  readonly plan: PlanDocument;
  /** No order with fewer moved works, proven with the bed left out. */
  readonly least: boolean;
}

interface State { readonly formed: number; readonly last: number; readonly order: readonly number[]; readonly moved: readonly number[] }

/** Orders handed to the planner, at the most. */
const MOST_ORDERS = 12;

/**
 * The order nearest to a person's own that gives a plan: the fewest entries taken out and put in elsewhere, the others keeping their
 * sequence. Breadth first by how many are moved, over (formed set, last entry kept): exact with the bed left out; each is then really planned.
 */
export function fewestMoved({ attempts, situations }: WhyFacts, own: readonly string[]): MovedOrder | null {
  const why = situations.first();
  if (why === undefined) return null;
  const can = strokeTest(why, own);
  const all = 2 ** why.situation.part.bends.length - 1;
  const seen = new Set<string>();
  let level: readonly State[] = [{ formed: 0, last: -1, order: [], moved: [] }];
  let [asked, exact] = [0, true];
  while (level.length > 0) {
    const next: State[] = [];
    const open = [...level];
    for (let state = open.pop(); state !== undefined; state = open.pop()) {
      const key = `${state.formed}/${state.last}`;
      if (attempts.ended()) return null;
      if (state.formed === all) {
        const order = state.order.map((entry) => own[entry] ?? "");
        const attempt = attempts.first({ order });
        if (attempt.kind === "works") return { order, strokes: state.moved.map((entry) => own[entry] ?? ""), plan: attempt.plan, least: exact };
        [asked, exact] = [asked + 1, false];
        if (asked >= MOST_ORDERS) return null;
        continue;
      }
      if (seen.has(key)) continue;
      seen.add(key);
      own.forEach((_, entry) => {
        if (state.order.includes(entry)) return;
        const formed = can(entry, state.formed);
        if (formed === null) return;
        const order = [...state.order, entry];
        if (entry > state.last) open.push({ formed, last: entry, order, moved: state.moved });
        next.push({ formed, last: state.last, order, moved: [...state.moved, entry] });
      });
    }
    level = next;
  }
  return null;
}

/** The set of formed bends after an entry of the order, or null when it cannot be made in a state; strokes of one bend in a row are made one after the other. */
function strokeTest({ situation, checks }: WhySituation, own: readonly string[]): (entry: number, formed: number) => number | null {
  const { part, moves } = situation;
  const { option } = relaxedProblem(situation, checks, createGaugeNumbers());
  const masks = own.map((entry) => {
    const ids = entry.split("+").map((id) => id.trim());
    return part.bends.reduce((mask, { id }, bend) => (ids.includes(drawnBend(id)) ? mask | (1 << bend) : mask), 0);
  });
  const reaches = (mask: number, drawn: number, formed: number): boolean => (formed & mask) === mask || moves.some((move, index) =>
    (move.mask & formed) === 0 && (move.mask & ~mask) === 0 && new Set(move.bends.map((bend) => drawnBend(part.bends[bend]?.id ?? ""))).size === drawn
    && option(index, formed, 0) !== null && reaches(mask, drawn, formed | move.mask));
  return (entry, formed) => {
    const mask = masks[entry] ?? 0;
    return reaches(mask, own[entry]?.split("+").length ?? 0, formed) ? formed | mask : null;
  };
}
