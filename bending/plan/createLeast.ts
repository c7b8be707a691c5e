import { bitCount } from "../order/bitCount";
import { createFacts, type BlockedPattern } from "../order/createFacts";
import type { LeastOption } from "../order/orderProblem";
import { pickBits } from "../order/pickBits";
import { bendsBehind } from "./bendsBehind";
import type { StepChecks } from "./createStepChecks";
import { createNearTools } from "./createNearTools";
import { createOverhang } from "./createOverhang";
import { gaugeDemerits } from "./gaugeDemerits";
import type { GaugeNumbers } from "./gaugeNumbers";
import { gaugePatterns, type GaugePattern } from "./gaugePatterns";
import type { Situation } from "./situation";

/** Bends that are told apart for one move, the nearest to it: all of them, or few where all would make the tables larger than they are worth. */
const ALL_UP_TO = 16;
const FEW = 12;

/** What is known of steps without asking, and grows with every answer. */
export interface Least {
  readonly of: (move: number, formed: number) => LeastOption | null;
  /** The move cannot be made in any state of the pattern. */
  readonly block: (move: number, pattern: BlockedPattern) => void;
  /**
   * All pairs gauge the move at this setting with so many fingers, also in every state that is the same behind the die; where the half in
   * front may reach over the line, in this state alone, and elsewhere no more fingers than that.
   */
  readonly settle: (move: number, formed: number, gauge: number, fingers: number) => void;
  readonly learned: () => number;
}

/**
 * What is known of a step from the places alone that fingers could touch, nothing asked of clearance: with no place there
 * is no gauge, and with some the setting is one of theirs. Worked out for a move when it is first asked for.
 */
export function createLeast(situation: Situation, checks: StepChecks, numbers: GaugeNumbers): Least {
  const { moves, pairs, fits } = situation;
  const toldApart = situation.part.bends.length - 1 <= ALL_UP_TO ? ALL_UP_TO : FEW;
  const patternsOf = gaugePatterns(situation, toldApart);
  const settings = createSettings(situation, numbers);
  const tables = moves.map((): ((formed: number) => LeastOption | null) | null => null);
  /** Wishes that the best of the pairs that fit leaves unmet; Infinity when none fits. */
  const leastWishes = (move: number): number => {
    const usable = pairs.filter(({ index }) => moves[move]?.bends.every((bend) => fits[bend]?.[index]?.ok));
    return Math.min(...usable.map(({ index }) => checks.wishes(move, index)));
  };
  const tableFor = (move: number) => {
    const wishes = leastWishes(move);
    if (wishes === Infinity) return () => null;
    const patterns = patternsOf(move);
    const window = windowOf(patterns, toldApart);
    const pick = pickBits(window);
    const sets = settings.sets(patterns, window, pick);
    const options = new Map<number, LeastOption>();
    for (const set of new Set(sets)) options.set(set, settings.option(set, wishes));
    const answers = Array.from(sets, (set) => options.get(set) ?? null);
    return (formed: number) => answers[pick(formed)] ?? null;
  };
  const facts = createFacts(moves.length);
  const behind = moves.map(({ bends, front }) => bendsBehind(situation, { bends, front, formed: 0 }));
  const overhangs = createOverhang(situation);
  /** Settled answers of moves that all pairs gauge alike, by what is formed behind the die; of states with an overhang each by itself. */
  const gauged = moves.map(() => new Map<number, LeastOption>());
  const overhung = moves.map(() => new Map<number, LeastOption>());
  let settled = 0;
  const table = (move: number, formed: number): LeastOption | null => {
    const known = tables[move] ?? tableFor(move);
    tables[move] = known;
    return known(formed);
  };
  return {
    of: (move, formed) => {
      if (facts.blocked(move, formed)) return null;
      const own = gauged[move];
      const alone = overhung[move];
      const here = alone && alone.size > 0 ? alone.get(formed) : undefined;
      if (here !== undefined) return here;
      const found = own && own.size > 0 ? own.get(formed & (behind[move] as number)) : undefined;
      if (found === undefined) return table(move, formed);
      // What reaches over can only take room from the fingers; which setting is the best then is not known.
      return overhangs(move, formed) ? { demerit: found.demerit, gauges: null } : found;
    },
    block: facts.block,
    settle: (move, formed, gauge, fingers) => {
      const hidden = formed & (behind[move] ?? 0);
      const guess = table(move, formed);
      const over = overhangs(move, formed);
      const answers = over ? overhung[move] : gauged[move];
      const key = over ? formed : hidden;
      if (guess === null || answers === undefined || answers.has(key)) return;
      const demerit = leastWishes(move) + gaugeDemerits(fingers);
      if (guess.demerit === demerit && guess.gauges?.length === 1) return;
      answers.set(key, { demerit, gauges: [gauge] });
      settled += 1;
    },
    learned: () => facts.count() + settled,
  };
}

/** The bends that patterns speak of, as many of the nearest as are told apart: patterns of few bends are near. */
function windowOf(patterns: readonly GaugePattern[], most: number): number {
  let window = 0;
  let count = 0;
  for (const { mask } of [...patterns].sort((a, b) => bitCount(a.mask) - bitCount(b.mask))) {
    for (let rest = mask & ~window; rest !== 0 && count < most; rest &= rest - 1) {
      window |= rest & -rest;
      count += 1;
    }
  }
  return window;
}

interface Place { readonly numbers: readonly number[] | null; readonly z: readonly [number, number] }

/** Sets of places to touch, each set kept once under a number; 0 is the empty one. */
function createSettings(situation: Situation, numbers: GaugeNumbers) {
  const { machine } = situation;
  const places: Place[] = [];
  const placeNumbers = new Map<string, number>();
  const members: (readonly number[])[] = [[]];
  const longer = new Map<number, number>();
  const nearTools = createNearTools(situation);
  const placeOf = ({ contact }: GaugePattern): number => {
    const found: Place = contact === null || nearTools(contact)
      ? { numbers: null, z: contact?.z ?? [-Infinity, Infinity] }
      : { numbers: [...new Set([-1, 1].map((side) => numbers({ ...contact, x: contact.x + side * NOISE_MM, r: contact.r + side * NOISE_MM, free: [] })))], z: contact.z };
    const key = `${found.numbers?.join() ?? "any"}/${found.z.map((z) => z.toFixed(2)).join()}`;
    const known = placeNumbers.get(key) ?? places.push(found) - 1;
    placeNumbers.set(key, known);
    return known;
  };
  const extended = (set: number, place: number): number => {
    const key = set * 65_536 + place;
    const known = longer.get(key);
    if (known !== undefined) return known;
    const old = members[set] ?? [];
    const made = old.includes(place) ? set : members.push([...old, place]) - 1;
    longer.set(key, made);
    return made;
  };
  return {
    /** For every state of the window the set of places that there may be. */
    sets: (patterns: readonly GaugePattern[], window: number, pick: (set: number) => number): Int32Array => {
      const size = 2 ** bitCount(window);
      const sets = new Int32Array(size);
      for (const pattern of patterns) {
        const place = placeOf(pattern);
        const value = pick(pattern.value & window);
        const free = (size - 1) & ~pick(pattern.mask & window);
        for (let rest = free; ; rest = (rest - 1) & free) {
          sets[value | rest] = extended(sets[value | rest] as number, place);
          if (rest === 0) break;
        }
      }
      return sets;
    },
    option: (set: number, wishes: number): LeastOption => {
      const found = (members[set] ?? []).map((index) => places[index] as Place);
      if (found.length === 0) return { demerit: wishes + gaugeDemerits(0), gauges: [numbers(undefined)] };
      const spread = Math.max(...found.map(({ z }) => z[1])) - Math.min(...found.map(({ z }) => z[0]));
      const fingers = machine.gauge.fingers >= 2 && spread >= machine.gauge.minSpread - NOISE_MM ? 2 : Math.min(1, machine.gauge.fingers);
      const all = found.flatMap((place) => place.numbers ?? []);
      return { demerit: wishes + gaugeDemerits(fingers), gauges: found.some((place) => place.numbers === null) ? null : [...new Set(all)].sort((a, b) => a - b) };
    },
  };
}

/** mm. Over rounding noise, far under what settings are told apart by. */
const NOISE_MM = 1e-6;
