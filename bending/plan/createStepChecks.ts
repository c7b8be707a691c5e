import type { Hit } from "../clearance/hit";
import type { Interval } from "../geometry/interval";
import { fingerMeetsTools } from "../setup/fingerMeetsTools";
import type { GaugeOption } from "../setup/gaugeOption";
import { gaugeOptions } from "../setup/gaugeOptions";
import type { Tool } from "../tooling/tool";
import { createKeeping } from "../gauging/createKeeping";
import { fingerHeight } from "../setup/fingerHeight";
import { bendsBehind } from "./bendsBehind";
import { fingerCount } from "./fingerCount";
import { passesFrames } from "./passesFrames";
import { sheetReach } from "./sheetReach";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

interface Pattern { readonly mask: number; readonly value: number }

/** The yes-or-no questions of a search, each answered once. */
export interface StepChecks {
  readonly hitOf: (move: number, formed: number) => Hit;
  /** Can the pair form these bends now, given room on the bed? */
  readonly possible: (move: number, formed: number, pair: number) => boolean;
  /** Where the tool must not stand while the move is made, z from the line's middle. */
  readonly forbidden: (move: number, formed: number, pair: number, obstacle: Tool) => readonly Interval[];
  /** Ways to gauge the sheet that clear the tools of the pair, best first. */
  readonly gauges: (move: number, formed: number, pair: number) => readonly GaugeOption[];
  /** How many lengths that the document asks for are not held when the move is gauged so. */
  readonly unkept: (move: number, formed: number, option: GaugeOption | undefined) => number;
  /** Do all pairs that fit gauge this move alike? */
  readonly gaugesAgree: (move: number, formed: number) => boolean;
  /** Unmet wishes of the pair for the move. */
  readonly wishes: (move: number, pair: number) => number;
}

export function createStepChecks(situation: Situation): StepChecks {
  const { part, machine, moves, pairs, clearance, fits } = situation;
  const moveOf = (move: number) => must(moves[move]);
  const pairOf = (pair: number): ToolPair => must(pairs[pair]);
  const hitOf = (move: number, formed: number): Hit => ({ bends: moveOf(move).bends, front: moveOf(move).front, formed });
  const behind = moves.map((move) => bendsBehind(situation, { bends: move.bends, front: move.front, formed: 0 }));
  const state = (move: number, formed: number) => formed * moves.length + move;

  /** What blocked a move once blocks it in every state that agrees with the pattern; the part meeting itself, with every tool. */
  const patterns = pairs.map(() => new Map<number, readonly Pattern[]>());
  const selfPatterns = new Map<number, readonly Pattern[]>();
  const possible = remember((move, formed, pair) => {
    const { punch, die } = pairOf(pair);
    let force = 0;
    let needed = 0;
    for (const bend of moveOf(move).bends) {
      const fit = fits[bend]?.[pair];
      if (!fit?.ok) return false;
      force = fit.force;
      needed = Math.max(needed, fit.reach);
    }
    if ((force * moveOf(move).bentLength) / 1000 > machine.maxForce) return false;
    const reach = sheetReach(part, hitOf(move, formed));
    if (Math.min(reach.front, reach.back) < needed) return false;
    if (!passesFrames(part, hitOf(move, formed), reach.back, machine)) return false;
    const agrees = ({ mask, value }: Pattern) => (formed & mask) === value;
    const ofPair = patterns[pair]?.get(move) ?? [];
    if (selfPatterns.get(move)?.some(agrees) || ofPair.some(agrees)) return false;
    const hits = clearance.firstBlock(hitOf(move, formed), punch, die);
    if (hits.length === 0) return true;
    const own = hits.filter(({ kind }) => kind === "self");
    if (own.length > 0) selfPatterns.set(move, [...(selfPatterns.get(move) ?? []), ...own.map(({ mask, value }) => ({ mask, value }))]);
    else patterns[pair]?.set(move, [...ofPair, ...hits.map(({ mask, value }) => ({ mask, value }))]);
    return false;
  });
  const intervals = pairs.map(() => new Map<Tool, Map<number, readonly Interval[]>>());
  const allGauges = new Map<number, readonly GaugeOption[]>();
  const fingers = new Map<string, boolean>();
  const meets = (option: GaugeOption, { index, punch, die }: ToolPair): boolean => {
    const ends = [option.free[0]?.[0] ?? 0, option.free[option.free.length - 1]?.[1] ?? 0];
    return ends.some((z) => {
      const x = option.x + option.slope * z;
      const key = `${index}/${x.toFixed(3)}/${option.r.toFixed(3)}`;
      const known = fingers.get(key) ?? fingerMeetsTools(x, option.r, part.thickness, punch, die, machine);
      fingers.set(key, known);
      return known;
    });
  };
  const { gaugeRepeat, angleRepeat } = machine.settings;
  const keeping = createKeeping(part, { gauge: gaugeRepeat, angle: angleRepeat }, fingerHeight(machine.gauge), (option) => fingerCount(option, machine.gauge));
  const gauges = (move: number, formed: number, pair: number): readonly GaugeOption[] => {
    const hidden = formed & (behind[move] ?? 0);
    const key = state(move, hidden);
    const any = pairOf(0);
    const found = allGauges.get(key) ?? gaugeOptions(part, hitOf(move, hidden), machine, any.punch, any.die);
    allGauges.set(key, found);
    const clear = found.filter((option) => !meets(option, pairOf(pair)));
    return keeping === null ? clear : keeping.preferred(hitOf(move, hidden), clear);
  };
  return {
    hitOf,
    possible,
    gauges,
    unkept: (move, formed, option) => (keeping === null || option === undefined ? 0 : keeping.unkept(hitOf(move, formed), option)),
    gaugesAgree: (move, formed) => {
      const usable = pairs.filter(({ index }) => moveOf(move).bends.every((bend) => fits[bend]?.[index]?.ok));
      const first = usable.map(({ index }) => gauges(move, formed, index)[0]);
      return first.every((option) => option === first[0]);
    },
    forbidden: (move, formed, pair, obstacle) => {
      const known = must(intervals[pair]).get(obstacle) ?? new Map<number, readonly Interval[]>();
      must(intervals[pair]).set(obstacle, known);
      const key = state(move, formed);
      const answer = known.get(key);
      if (answer !== undefined) return answer;
      const found = clearance.forbidden(hitOf(move, formed), pairOf(pair).punch, pairOf(pair).die, obstacle);
      known.set(key, found);
      return found;
    },
    wishes: (move, pair) => moveOf(move).bends.reduce((sum, bend) => {
      const fit = fits[bend]?.[pair];
      return sum + (fit?.ok ? fit.wishes.length : 0);
    }, 0),
  };

  function remember(ask: (move: number, formed: number, pair: number) => boolean) {
    const known = pairs.map(() => new Map<number, boolean>());
    return (move: number, formed: number, pair: number): boolean => {
      const answers = must(known[pair]);
      const key = state(move, formed);
      const answer = answers.get(key);
      if (answer !== undefined) return answer;
      const found = ask(move, formed, pair);
      answers.set(key, found);
      return found;
    };
  }
}

function must<T>(value: T | undefined): T {
  if (value === undefined) throw new Error("invariant: a move or pair of the situation");
  return value;
}
