import type { OrderStep } from "../order/orderProblem";
import type { Layout, Station } from "../setup/layout";
import { NEAR_GAP_MM, placeStations } from "../setup/placeStations";
import { stationLength } from "../setup/layout";
import { nearMiddle, type StationLoad } from "../setup/nearMiddle";
import { offCentreReach } from "../tooling/offCentre";
import type { BedQuestion } from "./bedQuestion";
import { placeStep } from "./placeStep";
import { stepLoad } from "./stepLoad";

/**
 * Where real stations may stand: near each other, as near as the wanted steps leave one another's tools free, and so
 * far apart that the overhanging sheet passes clear of the next one; in every order from left to right.
 */
export function bedsOf(question: BedQuestion, stations: readonly Station[], wanted: readonly OrderStep[]): readonly Layout[] {
  const { situation, checks } = question;
  const { machine } = situation;
  const strokes = wanted.map(({ station }) => station);
  const near = placeStations(stations, [NEAR_GAP_MM], machine, strokes);
  if (stations.length < 2) return near;
  const loads = machine.settings.offCentre === undefined ? [] : wanted.flatMap((step): readonly StationLoad[] => {
    const station = stations[step.station];
    if (station === undefined) return [];
    const { forceKN, offset } = stepLoad(situation, checks, station, step);
    return [{ station: step.station, offset, reach: offCentreReach(machine, forceKN) }];
  });
  const borne = (layouts: readonly Layout[]) => layouts.map((layout) => nearMiddle(layout, loads, machine.bedLength));
  const overhang = Math.max(NEAR_GAP_MM, Math.ceil(partOverhang(question)));
  const clears = (layout: Layout) => wanted.every((step) => placeStep(situation, checks, nearMiddle(layout, loads, machine.bedLength), step) !== null);
  const gaps = gapsBeside(question, stations, wanted).filter((gap) => gap > NEAR_GAP_MM && gap < overhang);
  const between: Layout[] = [];
  near.forEach((layout, order) => {
    if (clears(layout)) return;
    // A gap that is too small for the wanted steps may do for the same strokes in another order.
    for (const gap of gaps) {
      const wider = placeStations(stations, [gap], machine, strokes)[order];
      if (wider) between.push(wider);
      if (wider && clears(wider)) return;
    }
  });
  return borne([...near, ...between, ...placeStations(stations, [overhang], machine, strokes)]);
}

/**
 * Gaps at which a neighbour's run just ends where the room begins that a wanted stroke forbids, when it is made, and were it made first or last, with its line in the
 * middle of its station and as far off as the station holds it; up to the next whole millimetre.
 */
function gapsBeside({ situation: { pairs, moves, part, machine }, checks }: BedQuestion, stations: readonly Station[], wanted: readonly OrderStep[]): readonly number[] {
  const gaps = new Set<number>();
  const all = 2 ** part.bends.length - 1;
  for (const { move, formed, station } of wanted) {
    const [own, stroke] = [stations[station], moves[move]];
    if (own === undefined || stroke === undefined) continue;
    const off = Math.max(0, Math.min(own.punch.length, own.die.length) / 2 - stroke.halfLength + machine.settings.maxUncoveredEnd);
    for (const other of stations) {
      const tools = pairs[other.pair];
      if (other === own || tools === undefined) continue;
      for (const [tool, run] of [[tools.punch, other.punch], [tools.die, other.die]] as const) {
        const beside = stationLength(own) / 2 + (stationLength(other) - run.length) / 2;
        for (const state of new Set([formed, 0, all & ~stroke.mask])) {
          for (const edge of checks.forbidden(move, state, own.pair, tool).flat()) {
            for (const aside of [0, off]) gaps.add(Math.ceil(Math.abs(edge) - aside - beside - NOISE_MM));
          }
        }
      }
    }
  }
  return [...gaps].sort((a, b) => a - b);
}

/** mm. Over rounding noise, within what counts as touching. */
const NOISE_MM = 1e-6;

/** How far the sheet sticks out beyond a bend line at the most: a station this far off is never in the way. */
function partOverhang({ situation: { part, moves, machine } }: BedQuestion): number {
  const corners = part.faces.flatMap(({ outline }) => outline);
  const size = Math.hypot(span(corners.map((p) => p[0])), span(corners.map((p) => p[1])));
  return size - Math.min(...moves.map(({ halfLength }) => halfLength)) + machine.settings.clearance;
}

const span = (values: readonly number[]) => Math.max(...values) - Math.min(...values);
