import type { FlatCertificate, PlanCertificate } from "./certificate";
import { handlingByHand, handlingTime } from "../corpus/handlingByHand";

type Made = Extract<FlatCertificate["facts"][number], { kind: "made" }>;
type Times = PlanCertificate["times"];
/** What a step may have for a gauge setting (null: any), and the wishes that it leaves unmet at the least. */
interface Step { readonly gauges: readonly number[] | null; readonly demerit: number }

export interface CheapestWay {
  readonly seconds: number;
  /** The moves that take so long, first to last. */
  readonly moves: readonly number[];
}

/**
 * The least seconds of one part that the facts leave possible, unmet wishes weighed in; null when they leave no order at all. A plain forward
 * dynamic programme over (set of formed bends, last move): sets in rising order, as a stroke only adds bends.
 */
export function cheapestWay({ bends, moves, facts }: Pick<FlatCertificate, "bends" | "moves" | "facts">, times: Times, demeritSeconds: number): CheapestWay | null {
  const count = moves.length;
  const all = 2 ** bends.length - 1;
  const blocked = moves.map((_, move) => facts.filter((fact) => fact.kind === "blocked" && fact.move === move));
  const made = moves.map((_, move) => facts.filter((fact): fact is Made => fact.kind === "made" && fact.move === move));
  const handled = moves.map((from) => moves.map((to) => handlingTime(handlingByHand(from, to), times)));
  const best = new Float64Array((all + 1) * count).fill(Infinity);
  const from = new Int16Array((all + 1) * count).fill(-1);
  for (let formed = 0; formed <= all; formed += 1) {
    const free = moves.map((move, which) => (move.mask & formed) === 0 && !blocked[which]?.some(({ mask, value }) => (formed & mask) === value));
    const ways = moves.map((_, last) => (formed === 0 ? Infinity : best[formed * count + last] as number));
    if (formed === all) return Math.min(...ways) === Infinity ? null : { seconds: Math.min(...ways), moves: backwards(ways.indexOf(Math.min(...ways)), all) };
    if (formed !== 0 && ways.every((seconds) => seconds === Infinity)) continue;
    const before = moves.map((move, last) => (ways[last] === Infinity ? null : stepOf(made[last] ?? [], formed & ~move.mask)));
    free.forEach((can, which) => {
      if (!can) return;
      const step = stepOf(made[which] ?? [], formed);
      const own = times.stroke + step.demerit * demeritSeconds;
      let [seconds, cheapest] = [formed === 0 ? times.gaugeMove + own : Infinity, -1];
      for (let last = 0; last < count; last += 1) {
        const old = before[last];
        if (!old) continue;
        const longer = (ways[last] as number) + (handled[last]?.[which] ?? 0) + (mayStay(old, step) ? 0 : times.gaugeMove) + own;
        if (longer < seconds) [seconds, cheapest] = [longer, last];
      }
      const at = (formed | (moves[which]?.mask ?? 0)) * count + which;
      if (seconds < (best[at] as number)) [best[at], from[at]] = [seconds, cheapest];
    });
  }
  return null;

  function backwards(last: number, formed: number): readonly number[] {
    if (last < 0) return [];
    return [...backwards(from[formed * count + last] as number, formed & ~(moves[last]?.mask ?? 0)), last];
  }
}

/** What all facts together say of a step: the settings that every one of them names, the most wishes that any names. */
function stepOf(facts: readonly Made[], formed: number): Step {
  return facts.filter(({ mask, value }) => (formed & mask) === value).reduce<Step>((known, { gauges, demerit }) => ({
    demerit: Math.max(known.demerit, demerit),
    gauges: gauges === null ? known.gauges : known.gauges === null ? gauges : known.gauges.filter((one) => gauges.includes(one)),
  }), { gauges: null, demerit: 0 });
}

const mayStay = (from: Step, to: Step) => from.gauges === null || to.gauges === null || from.gauges.some((one) => to.gauges?.includes(one));
