import type { StationWish } from "../setup/layout";
import type { Situation } from "./situation";

/** How many likeliest pairs are tried together on a bed of two stations, and of three. */
const PAIRS_OF_TWO = 6;
const PAIRS_OF_THREE = 3;

/** mm. Shut heights of stations on one bed must agree this well, as one ram closes them all. Common practice, no source. */
const SAME_SHUT_HEIGHT_MM = 0.1;

/**
 * The sets of stations worth setting, by count: every bend has a station that its pair fits and its line is not
 * too long for. One station: every pair. Two and three: the likeliest pairs and those that `favoured` names.
 */
export function layoutWishes(situation: Situation, count: 1 | 2 | 3, favoured: ReadonlySet<number>): readonly (readonly StationWish[])[] {
  const limit = count === 1 ? Infinity : count === 2 ? PAIRS_OF_TWO : PAIRS_OF_THREE;
  const pairs = situation.pairs.filter(({ index }) => index < limit || favoured.has(index));
  const singles = pairs.flatMap((pair) => lineLengths(situation, pair.index).map((lineLength): StationWish =>
    ({ pair: pair.index, punch: pair.punch, die: pair.die, lineLength })));
  return sets(singles, count).filter((wishes) => sameHeight(wishes) && serves(situation, wishes) && noneIdle(situation, wishes));
}

/** The different lengths of line that the pair may have to hold, longest first. */
function lineLengths({ moves, fits }: Situation, pair: number): readonly number[] {
  const lengths = moves.filter(({ bends }) => bends.every((bend) => fits[bend]?.[pair]?.ok)).map(({ halfLength }) => Math.round(halfLength * 2e4) / 1e4);
  return [...new Set(lengths)].sort((a, b) => b - a);
}

function sets<T>(items: readonly T[], count: number): readonly (readonly T[])[] {
  if (count === 0) return [[]];
  return items.flatMap((item, index) => sets(items.slice(index + 1), count - 1).map((rest) => [item, ...rest]));
}

function sameHeight(wishes: readonly StationWish[]): boolean {
  const heights = wishes.map(({ punch, die }) => punch.height + die.height);
  return Math.max(...heights) - Math.min(...heights) <= SAME_SHUT_HEIGHT_MM;
}

const holds = ({ moves, fits }: Situation, wish: StationWish, bend: number) => fits[bend]?.[wish.pair]?.ok === true
  && moves.some((move) => move.bends.includes(bend) && move.halfLength * 2 <= wish.lineLength + 1e-3);

/** Can every bend be made somewhere? */
const serves = (situation: Situation, wishes: readonly StationWish[]) =>
  situation.part.bends.every((_, bend) => wishes.some((wish) => holds(situation, wish, bend)));

/** Does every station hold a bend at all? */
const noneIdle = (situation: Situation, wishes: readonly StationWish[]) =>
  wishes.every((wish) => situation.part.bends.some((_, bend) => holds(situation, wish, bend)));
