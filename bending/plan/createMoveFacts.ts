import type { Situation } from "./situation";
import { createSheetReach } from "./createSheetReach";
import { passesFrames } from "./passesFrames";

/** What of a move does not depend on what is formed, or is quickly told from it. */
export interface MoveFacts {
  /** By pair: how much level sheet it needs on either side of the line, mm; null when it cannot make the move at all. */
  readonly needed: readonly (number | null)[];
  /** The pairs that fit every bend of the move, strong enough or not. */
  readonly fitting: readonly number[];
  /** By pair: unmet wishes. */
  readonly wishes: readonly number[];
  /** Does enough sheet lie level, and does it go between the frames? */
  readonly lies: (formed: number, needed: number) => boolean;
}

export function createMoveFacts({ part, machine, moves, pairs, fits }: Situation, move: number): MoveFacts {
  const found = moves[move];
  if (found === undefined) throw new Error("invariant: a move of the situation");
  const { bends, front, bentLength } = found;
  const ofPair = pairs.map((_, pair) => bends.map((bend) => fits[bend]?.[pair]));
  const reach = createSheetReach(part, bends, front);
  const narrow = passesFrames(part, { bends, front, formed: 0 }, Infinity, machine);
  return {
    needed: ofPair.map((ofBends) => {
      let [force, needed] = [0, 0];
      for (const fit of ofBends) {
        if (!fit?.ok) return null;
        force = fit.force;
        needed = Math.max(needed, fit.reach);
      }
      return (force * bentLength) / 1000 > machine.maxForce ? null : needed;
    }),
    fitting: ofPair.flatMap((ofBends, pair) => (ofBends.every((fit) => fit?.ok) ? [pair] : [])),
    wishes: ofPair.map((ofBends) => ofBends.reduce((sum, fit) => sum + (fit?.ok ? fit.wishes.length : 0), 0)),
    lies: (formed, needed) => {
      const level = reach(formed);
      return Math.min(level.front, level.back) >= needed && (narrow || level.back <= machine.throatDepth);
    },
  };
}
