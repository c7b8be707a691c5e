import { invariant } from "../../core/invariant";
import type { Machine } from "../../tooling/machine";
import type { Tool } from "../../tooling/tool";
import type { Run } from "../composeRuns";
import { NEAR_GAP_MM } from "../placeStations";
import { piecesOfCost } from "./carryCost";
import { createFewestPieces } from "./createFewestPieces";
import { createPieceStock, type PieceStock } from "./createPieceStock";
import { createToolShares } from "./createToolShares";
import { fewestStations } from "./fewestStations";
import type { PieceChoice } from "./pieceChoices";
import { createSearchEffort } from "./searchEffort";
import { sharedReasons } from "./sharedReasons";
import type { SharedWish } from "./sharedWish";
import { shutHeights } from "./shutHeights";

export interface SharedLimits {
  /** Steps of the search before it gives up proving; 200 000 unless said. */
  readonly steps?: number;
  readonly shouldStop?: () => boolean;
}

/** One bed that serves many bends. */
export interface SharedSetup {
  /** `feasible`: it serves all, but a better one may be left. `unknown`: none was found, and none was ruled out. */
  readonly status: "optimal" | "feasible" | "infeasible" | "unknown";
  /** Left to right. */
  readonly stations: readonly SharedStation[];
  /** Different punches and dies. */
  readonly kinds: number;
  readonly pieces: number;
  /** All pieces together, mm. */
  readonly carried: number;
  readonly proof: { readonly method: string; readonly steps: number; /** No bed has fewer stations. */ readonly leastStations: number };
  /** Why there is none, in mm. */
  readonly reasons: readonly string[];
}

export interface SharedStation {
  readonly punch: string;
  readonly die: string;
  readonly punchRun: Run;
  readonly dieRun: Run;
  /** Middle of the station and of each line that it holds, from the middle of the bed, mm. */
  readonly z: number;
  readonly wishes: readonly { readonly id: string; readonly z: number }[];
}

const STEPS = 200_000;

/**
 * The bed with the fewest stations that serves all wishes: of those the one with the fewest kinds of tools, then with the fewest pieces,
 * then with the least length to carry. Proven over: whole pieces without horns of the stock given, drawn apart by equal
 * gaps within the machine's limit; punch and die run with one middle; one shut height; stations so far apart that no part
 * comes where another stands (`standOnBed`). `stock` are the tools in service.
 */
export function sharedSetup(wishes: readonly SharedWish[], stock: readonly Tool[], machine: Machine, limits: SharedLimits = {}): SharedSetup {
  const effort = createSearchEffort(limits.steps ?? STEPS, limits.shouldStop ?? (() => false));
  const named = new Set(wishes.flatMap(({ ways }) => ways.flatMap(({ punch, die }) => [`punch ${punch}`, `die ${die}`])));
  const stocks = stock.filter(({ kind, id }) => named.has(`${kind} ${id}`)).map((tool) => createPieceStock(tool, machine.bedLength, machine.settings.maxSectionGap, effort));
  const fewest = createFewestPieces(stocks);
  const classes = shutHeights(wishes, stocks, fewest, machine.settings);
  const whole = classes.filter(({ missing }) => missing.length === 0);
  const found = fewestStations({ classes: whole, wishes, stocks, fewest, shares: createToolShares(stocks, machine.settings.maxSectionGap, effort), machine, effort });
  const proof = { method: method(whole.length), steps: effort.steps(), leastStations: found.leastStations };
  const empty = { stations: [], kinds: 0, pieces: 0, carried: 0, proof };
  if (wishes.length === 0) return { status: "optimal", ...empty, reasons: [] };
  if (found.best === null) {
    const open = effort.spent() || found.lost;
    return { status: open ? "unknown" : "infeasible", ...empty, reasons: sharedReasons({ wishes, stocks, classes, machine, leastStations: found.leastStations, spent: effort.spent(), lost: found.lost }) };
  }
  const { places, stations, pieces, kinds, cost } = found.best;
  const count = piecesOfCost(cost);
  const taken = stocks.map(({ kinds: ofTool }) => ofTool.map(() => 0));
  const made = stations.map(({ punch, die }, index) => {
    const given = pieces[index];
    invariant(given !== undefined, "every station has its pieces");
    return { punchRun: runOf(stocks, taken, punch, given.punch, given.punchLength), dieRun: runOf(stocks, taken, die, given.die, given.dieLength) };
  });
  return {
    status: found.best.proven ? "optimal" : "feasible",
    stations: places.map(({ station, z, wishes: served }): SharedStation => {
      const [place, runs] = [stations[station], made[station]];
      invariant(place !== undefined && runs !== undefined, "a station that stands was found");
      return { punch: stocks[place.punch]?.tool.id ?? "", die: stocks[place.die]?.tool.id ?? "", ...runs, z, wishes: served };
    }),
    kinds, pieces: count, carried: Math.round((cost - count * 1e6) * 1000) / 1000, proof, reasons: [],
  };
}

const method = (classes: number) => `every division of the bends among stations, every share of the pieces, ${classes === 1 ? "one shut height" : `${classes} shut heights`}; stations ${NEAR_GAP_MM} mm apart or as far as the parts stick out`;

/** The real pieces of a choice, longest first, each taken once. */
function runOf(stocks: readonly PieceStock[], taken: number[][], tool: number, { counts, length }: PieceChoice, wanted: number): Run {
  const [stock, used] = [stocks[tool], taken[tool]];
  invariant(stock !== undefined && used !== undefined, "a station's tool is in stock");
  const pieces = counts.flatMap((count, kind) => {
    const from = used[kind] ?? 0;
    used[kind] = from + count;
    return stock.kinds[kind]?.pieces.slice(from, from + count) ?? [];
  });
  return { pieces, gap: pieces.length > 1 ? Math.max(0, (wanted - length) / (pieces.length - 1)) : 0, length: wanted };
}
