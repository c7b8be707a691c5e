import type { Interval } from "@/bending/geometry/interval";
import type { Answer, Questions } from "./everyQuestion";

export interface Standing { readonly pair: number; readonly punch: number; readonly die: number; /** Middle of both runs, mm along the bed. */ readonly z: number }

export interface Bed { readonly stations: readonly Standing[]; readonly walks: boolean }

/** mm. Ends that meet within this do not overlap. */
const TOUCHING = 1e-6;

/**
 * The stroke at one station of the bed, or null: somewhere its line must be covered by both runs but for what may stay uncovered, with no run
 * on the bed where it must not stand. What may be tried is each place where one of the limits is just kept.
 */
export function placedOn(questions: Questions, { stations }: Bed, index: number, move: number, formed: number): Answer | null {
  const own = stations[index];
  const answer = own ? questions.ask(move, formed, own.pair) : null;
  if (!own || answer === null) return null;
  const { pairs, machine } = questions.situation;
  const reach = Math.min(own.punch, own.die) / 2 - answer.halfLength + machine.settings.maxUncoveredEnd;
  if (reach < -TOUCHING) return null;
  const bars = stations.flatMap((other): Interval[] => {
    const tools = pairs[other.pair];
    if (!tools) return [];
    const ofRun = (length: number, forbidden: readonly Interval[]) => forbidden.map(([from, to]): Interval => [other.z - own.z - length / 2 - to, other.z - own.z + length / 2 - from]);
    return [...ofRun(other.punch, answer.forbidden(tools.punch)), ...ofRun(other.die, answer.forbidden(tools.die))];
  });
  const places = [0, -Math.max(0, reach), Math.max(0, reach), ...bars.flat()].filter((at) => Math.abs(at) <= Math.max(0, reach));
  return places.some((at) => bars.every(([from, to]) => at <= from + TOUCHING || at >= to - TOUCHING)) ? answer : null;
}
