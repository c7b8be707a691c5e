import { handlingByHand, handlingTime, type Lying } from "../../corpus/handlingByHand";
import type { Answer, Questions } from "./everyQuestion";
import { DEMERIT } from "./exhaustivePlan";

export interface EveryOrder {
  /** Seconds a part and its unmet wishes, weighed in. */
  readonly weight: number;
  readonly demerits: number;
  readonly order: readonly string[];
}

interface Place<Station> { readonly stations: readonly Station[]; readonly walks: boolean }
interface Done { readonly lying: Lying; readonly z: number; readonly gauge: string }

/** With so few ways to make a stroke every order is walked to its end; with more, what follows an equal set and an equal last stroke is remembered. */
const WALKED_UP_TO = 8;

/**
 * The best order on a bed: every stroke next, with every front, at every station. Nothing is cut off; as what follows depends on nothing but the bends
 * formed and on how and where the last of them was made, that much is remembered where all orders would be too many.
 */
export function everyOrderOn<Station extends { readonly z: number }>(
  { situation }: Questions, { stations, walks }: Place<Station>, option: (move: number, formed: number, station: Station, index: number) => Answer | null,
): EveryOrder | null {
  const { moves, part, machine: { times } } = situation;
  const all = 2 ** part.bends.length - 1;
  const lying = moves.map(({ pose }): Lying => ({ up: pose.up, heading: (pose.heading * 180) / Math.PI }));
  const known = new Map<string, EveryOrder | null>();
  const options = new Map<number, Answer | null>();
  const optionOf = (move: number, formed: number, station: Station, index: number): Answer | null => {
    const key = (formed * moves.length + move) * stations.length + index;
    const answer = options.get(key);
    if (answer !== undefined) return answer;
    const found = option(move, formed, station, index);
    options.set(key, found);
    return found;
  };
  const onwards = (formed: number, last: Done | null, lastKey: string): EveryOrder | null => {
    if (formed === all) return { weight: 0, demerits: 0, order: [] };
    const key = `${formed}/${lastKey}`;
    const remembered = moves.length * stations.length > WALKED_UP_TO ? known.get(key) : undefined;
    if (remembered !== undefined) return remembered;
    let best: EveryOrder | null = null;
    moves.forEach((move, which) => {
      if (move.mask & formed) return;
      stations.forEach((station, index) => {
        const made = optionOf(which, formed, station, index);
        if (made === null) return;
        const now = { lying: lying[which] as Lying, z: station.z, gauge: made.gauge };
        const rest = onwards(formed | move.mask, now, `${which}/${index}/${made.gauge}`);
        if (rest === null) return;
        const handled = last === null ? times.gaugeMove
          : handlingTime(handlingByHand(last.lying, now.lying), times) + (walks ? (Math.abs(last.z - now.z) / 1000) * times.walkPerMetre : 0) + (last.gauge === now.gauge ? 0 : times.gaugeMove);
        const weight = times.stroke + handled + made.demerit * DEMERIT + rest.weight;
        if (best === null || weight < best.weight) best = { weight, demerits: made.demerit + rest.demerits, order: [move.bends.map((bend) => part.bends[bend]?.id).join("+"), ...rest.order] };
      });
    });
    known.set(key, best);
    return best;
  };
  return onwards(0, null, "");
}
