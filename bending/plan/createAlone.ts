import { createFacts, type Facts } from "../order/createFacts";
import type { StepOption } from "../order/orderProblem";
import { freeShifts } from "../setup/freeShifts";
import type { StationKind } from "../setup/stationKinds";
import { blockedPattern } from "./blockedPattern";
import type { StepChecks } from "./createStepChecks";
import { fingerCount } from "./fingerCount";
import { gaugeDemerits } from "./gaugeDemerits";
import type { GaugeNumbers } from "./gaugeNumbers";
import { roomPattern } from "./roomPattern";
import type { Situation } from "./situation";

/** Questions about one station alone on the bed. */
export interface Alone {
  /** Can a station of this kind make the move now? */
  readonly can: (kind: StationKind, move: number, formed: number) => boolean;
  /** Is it known without asking that it cannot? */
  readonly cannot: (kind: StationKind, move: number, formed: number) => boolean;
  /** How much was learned of a kind. */
  readonly learned: (kind: StationKind) => number;
  /** How the step is gauged and what it leaves unmet at the least, with a pair that can make it. */
  readonly option: (move: number, formed: number, pair: number) => StepOption;
}

/** What was learned of one kind of station. */
interface Learned { readonly facts: Facts; readonly known: Map<number, boolean> }

export function createAlone(situation: Situation, checks: StepChecks, numbers: GaugeNumbers): Alone {
  const { moves, pairs, machine, allowed, clearance } = situation;
  const options = pairs.map(() => new Map<number, StepOption>());
  const ofPair = pairs.map(() => createFacts(moves.length));
  const kinds = new Map<StationKind, Learned>();
  const learnedOf = (kind: StationKind): Learned => {
    const learned = kinds.get(kind) ?? { facts: createFacts(moves.length), known: new Map<number, boolean>() };
    kinds.set(kind, learned);
    return learned;
  };
  const find = ({ pair, punchLength, dieLength }: StationKind, facts: Facts, move: number, formed: number): boolean => {
    const tools = pairs[pair];
    if (!tools || !allowed(move, formed)) return false;
    if (!checks.possible(move, formed, pair)) {
      const pattern = blockedPattern(situation, checks, move, formed, [tools]);
      if (pattern) ofPair[pair]?.block(move, pattern);
      return false;
    }
    const reach = Math.min(punchLength, dieLength) / 2 - (moves[move]?.halfLength ?? 0) + machine.settings.maxUncoveredEnd;
    const found = freeShifts(reach, [
      { offset: 0, length: punchLength, forbidden: checks.forbidden(move, formed, pair, tools.punch) },
      { offset: 0, length: dieLength, forbidden: checks.forbidden(move, formed, pair, tools.die) },
    ]).length > 0;
    if (found) return true;
    const met = (tool: typeof tools.punch | typeof tools.die) => clearance.inStroke(checks.hitOf(move, formed), tools.punch, tools.die, tool);
    const pattern = roomPattern(reach, [{ length: punchLength, met: met(tools.punch) }, { length: dieLength, met: met(tools.die) }], formed);
    if (pattern) facts.block(move, pattern);
    return false;
  };
  const cannot = (kind: StationKind, move: number, formed: number) => ofPair[kind.pair]?.blocked(move, formed) === true || learnedOf(kind).facts.blocked(move, formed);
  return {
    cannot,
    learned: (kind) => (ofPair[kind.pair]?.count() ?? 0) + learnedOf(kind).facts.count(),
    can: (kind, move, formed) => {
      if (cannot(kind, move, formed)) return false;
      const { facts, known } = learnedOf(kind);
      const key = formed * moves.length + move;
      const answer = known.get(key) ?? find(kind, facts, move, formed);
      known.set(key, answer);
      return answer;
    },
    option: (move, formed, pair) => {
      const known = options[pair];
      const key = formed * moves.length + move;
      const answer = known?.get(key);
      if (answer !== undefined) return answer;
      const gauge = checks.gauges(move, formed, pair)[0];
      const fingers = gauge === undefined ? 0 : fingerCount(gauge, machine.gauge);
      const found = { gauge: numbers(gauge), demerit: checks.wishes(move, pair) + gaugeDemerits(fingers) + checks.unkept(move, formed, gauge) };
      known?.set(key, found);
      return found;
    },
  };
}
