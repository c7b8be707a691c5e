import type { Interval } from "../../geometry/interval";
import type { Machine } from "../../tooling/machine";
import { NEAR_GAP_MM } from "../placeStations";
import { SHORTEST_RUN_MM } from "../runsFor";
import { SAME_COST } from "./carryCost";
import { coverWishes, type OpenStation } from "./coverWishes";
import { createApartBound } from "./createApartBound";
import type { FewestPieces } from "./createFewestPieces";
import type { ToolShares } from "./createToolShares";
import type { PieceStock } from "./createPieceStock";
import { essentialWishes } from "./essentialWishes";
import type { PairPlace } from "./preparedWish";
import type { SearchEffort } from "./searchEffort";
import { sharePieces, type RoomStation, type SharedPieces } from "./sharePieces";
import type { SharedWish } from "./sharedWish";
import type { ShutHeight } from "./shutHeights";
import { standOnBed, type StationPlace } from "./standOnBed";
import { toolSubsets } from "./toolSubsets";

export interface FewestQuestion {
  readonly classes: readonly ShutHeight[];
  readonly wishes: readonly SharedWish[];
  readonly stocks: readonly PieceStock[];
  readonly fewest: FewestPieces;
  readonly shares: ToolShares;
  readonly machine: Machine;
  readonly effort: SearchEffort;
}

export interface FoundBed {
  readonly stations: readonly RoomStation[];
  readonly pieces: readonly SharedPieces[];
  readonly places: readonly StationPlace[];
  readonly kinds: number;
  readonly cost: number;
  /** False when the search was cut short, or passed over a better one that did not stand on the bed. */
  readonly proven: boolean;
}

export interface FewestAnswer {
  readonly best: FoundBed | null;
  /** No bed has fewer stations. */
  readonly leastStations: number;
  /** Stations and pieces were found that did not stand on the bed as they were placed. */
  readonly lost: boolean;
}

/** Steps for each count of stations at the first going over: enough where pieces are not scarce. */
const FIRST_STEPS = 20_000;

/**
 * The least count of stations for which there is a bed at all, counting up; then the least count of tools with which so many
 * stations do, counting up over sets of tools; then the cheapest of those beds. A count that takes long is passed over at first, so that there is
 * some bed to show, and gone into with all the effort that is left afterwards.
 */
export function fewestStations(question: FewestQuestion): FewestAnswer {
  const { classes, effort } = question;
  if (classes.length === 0) return { best: null, leastStations: 0, lost: false };
  const apart = Math.max(1, Math.min(...classes.map((one) => leastApart(question, one))));
  const first = countUp(question, apart, () => effort.portion(FIRST_STEPS));
  const found = first.least === first.count || effort.spent() ? first : countUp(question, first.least, () => effort);
  const at = found.beds.length > 0 ? found : { ...first, least: found.least, lost: found.lost, sure: false };
  if (at.beds.length === 0) return { best: null, leastStations: effort.spent() ? found.least : apart, lost: found.lost };
  const best = fewestKinds(question, at.count, at.beds);
  return { best: { ...best, proven: best.proven && at.sure && at.least === at.count }, leastStations: at.least, lost: found.lost };
}

interface Counted {
  /** The first count with a bed, or one over the last. */
  readonly count: number;
  readonly beds: readonly (Omit<FoundBed, "proven"> & { readonly of: ShutHeight })[];
  /** No bed has fewer stations than this. */
  readonly least: number;
  /** Every shut height was settled at the last count. */
  readonly sure: boolean;
  readonly lost: boolean;
}

function countUp(question: FewestQuestion, from: number, effortOf: () => SearchEffort): Counted {
  const { classes, wishes, machine } = question;
  const most = Math.min(wishes.length, Math.floor((machine.bedLength + NEAR_GAP_MM) / (SHORTEST_RUN_MM + NEAR_GAP_MM)));
  const tally = { lost: false };
  let [least, open] = [from, false];
  for (let count = from; count <= most; count += 1) {
    const beds: Counted["beds"][number][] = [];
    let sure = true;
    for (const of of classes) {
      const effort = effortOf();
      const before = { lost: false };
      const bed = solve({ ...question, effort }, of, of.pairs, count, Infinity, true, before);
      if (bed !== null) beds.push({ ...bed, of });
      else if (effort.spent() || before.lost) sure = false;
      tally.lost ||= before.lost && bed === null;
    }
    if (beds.length > 0) return { count, beds, least, sure, lost: tally.lost };
    open ||= !sure;
    if (!open) least = count + 1;
    if (question.effort.spent()) break;
  }
  return { count: most + 1, beds: [], least, sure: !open, lost: tally.lost };
}

function leastApart({ fewest }: FewestQuestion, { pairs, wishes }: ShutHeight): number {
  const asked = essentialWishes(wishes);
  return createApartBound(asked, pairs, fewest)(asked.map((_, index) => index)).stations;
}

/** Of the beds with so many stations the one with the fewest tools, then the cheapest; the first found when the search is cut short. */
function fewestKinds(question: FewestQuestion, count: number, known: Counted["beds"]): FoundBed {
  const { effort } = question;
  const start = known.reduce((a, b) => (b.kinds < a.kinds || (b.kinds === a.kinds && b.cost < a.cost) ? b : a));
  const tally = { lost: false };
  for (let kinds = 2; kinds <= start.kinds && !effort.spent(); kinds += 1) {
    let best: Omit<FoundBed, "proven"> | null = kinds === start.kinds ? start : null;
    for (const { of } of known) {
      for (const pairs of toolSubsets(of, kinds, effort)) best = solve(question, of, pairs, count, best?.cost ?? Infinity, false, tally) ?? best;
    }
    if (best !== null) return { ...best, proven: !effort.spent() && !tally.lost };
  }
  return { ...start, proven: false };
}

/** The cheapest bed (or the first one) of so many stations of these pairs; null when there is none under the cost. */
function solve({ wishes, stocks, fewest, shares, machine, effort }: FewestQuestion, { pairs: all, wishes: prepared }: ShutHeight, pairs: readonly PairPlace[], count: number, under: number, anyDoes: boolean, tally: { lost: boolean }): Omit<FoundBed, "proven"> | null {
  const chosen = pairs.map((pair) => all.indexOf(pair));
  const asked = essentialWishes(prepared.map(({ wish, rooms }) => ({ wish, rooms: chosen.map((index) => rooms[index] ?? null) })));
  const room = machine.bedLength - (count - 1) * NEAR_GAP_MM;
  let best: Omit<FoundBed, "proven"> | null = null;
  const limit = () => (best?.cost ?? under) - SAME_COST;
  const offer = (open: readonly OpenStation[]): number => {
    const stations = open.flatMap(({ pair, room: lengths }): readonly RoomStation[] => (pairs[pair] ? [{ ...pairs[pair], room: lengths }] : []));
    const shared = sharePieces({ stocks, shares, maxGap: machine.settings.maxSectionGap, room, effort }, stations, limit());
    if (shared === null) return limit();
    const standing = stations.map(({ punch, die }, index) => ({
      punch: stocks[punch]?.tool.id ?? "", die: stocks[die]?.tool.id ?? "", punchLength: shared.pieces[index]?.punchLength ?? 0, dieLength: shared.pieces[index]?.dieLength ?? 0,
    }));
    const places = standOnBed(standing, wishes, machine);
    if (places === null) { tally.lost = true; return limit(); }
    best = { stations, pieces: shared.pieces, places, kinds: new Set(stations.flatMap(({ punch, die }) => [punch, die])).size, cost: shared.cost };
    return anyDoes ? -Infinity : limit();
  };
  const shared = (open: readonly OpenStation[]): number => {
    let cost = 0;
    for (const side of ["punch", "die"] as const) {
      const spans = new Map<number, Interval[]>();
      for (const { pair, room: lengths } of open) {
        const tool = pairs[pair]?.[side] ?? 0;
        spans.set(tool, [...(spans.get(tool) ?? []), lengths[side]]);
      }
      for (const [tool, ofTool] of spans) cost += shares(tool, ofTool)?.cost ?? Infinity;
    }
    return cost;
  };
  coverWishes({ shared, wishes: asked, pairs, fewest, apart: createApartBound(asked, pairs, fewest), count, longest: room, offer, under: limit(), effort });
  return best;
}
