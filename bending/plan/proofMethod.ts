import { MOST_STATIONS, type VariantAnswer } from "./solveVariant";

export interface ProvenOver {
  /** The V that the flat pattern's radii follow from; null when the document gives them. */
  readonly vOpening: number | null;
  readonly answer: VariantAnswer;
  /** Pairs that fit some bend, looked over or not. */
  readonly allPairs: number;
}

/** Says what an answer is proven over, and nothing more. `flats`: how many flat patterns there are, planned or not; `ordered`: the order was given. */
export function proofMethod(over: readonly ProvenOver[], flats: number, ordered: boolean): string {
  if (over.length === 0) return "no punch and die fit any bend: decided before any search";
  const orders = ordered ? "every front in the order given" : "every order and front";
  const layouts = over.reduce((sum, { answer }) => sum + answer.layouts, 0);
  const last = over[over.length - 1];
  const pairs = last === undefined ? "" : pairsText(last);
  if (over.every(({ answer }) => answer.deadEnd !== null)) {
    const all = over.every(({ answer, allPairs }) => answer.pairs === allPairs);
    return `${orders}${flatsText(over.length)} with ${all ? `all ${Math.max(...over.map(({ allPairs }) => allPairs))} tool pairs that fit a bend` : pairs}, each bend with the shortest solid runs that the pieces make: none clears`;
  }
  const flat = last?.vOpening === null || last === undefined ? "" : `, the flat for a V of ${last.vOpening} mm${flats > 1 ? ` (${flats} flats are possible; the nearest to the usual V that gives a plan is taken)` : ""}`;
  const beds = over.every(({ answer }) => answer.deadEnd !== null || answer.anyStations)
    ? `up to ${MOST_STATIONS} stations (more take longer to set than the plan can save)` : `up to ${MOST_STATIONS} stations`;
  return `least total time over ${orders} with ${pairs}${flat}, on beds of ${beds} of solid runs, set apart as the orders tried ask for: ` +
    `${layouts} beds searched, the rest excluded by bounds${over.some(({ answer }) => answer.stopped) ? " as far as the time given and the memory allowed" : ""}`;
}

const pairsText = ({ answer: { pairs }, allPairs }: ProvenOver): string =>
  pairs === allPairs ? `all ${pairs} tool pairs that fit a bend` : `${pairs} of the ${allPairs} tool pairs that fit a bend (each shape of tool, the nearest V first)`;

const flatsText = (flats: number): string => (flats > 1 ? ` of each of ${flats} flats, one for each V` : "");
