import { formatLength } from "../core/formatLength";
import { mmPer, type LengthUnit } from "../core/units";
import { PAIRS_EXPLAINED } from "../plan/explain";
import type { FailedStroke, FailureReason } from "../plan/planFailure";
import { drawnReason } from "../plan/drawnPlan";
import { rounded } from "../plan/rounded";
import { stopsOf, type Stop } from "../plan/stopsOf";
import type { ToolPair } from "../plan/toolPair";
import { readStrip } from "../strokes/drawnIds";
import { bendsOf } from "./bendsOf";
import { placesThatWork } from "./placesThatWork";
import type { WhySituation } from "./situationsOf";

/** mm. Less line left free is not worth telling. */
const FREE_MM = 10;

/** A stop, and with which front and which tools. */
interface Met { readonly stop: Stop; readonly front: string; readonly pair: ToolPair; readonly halfLength: number }

/** Everything that keeps a stroke from being made in a state, what stops the front and pair that come nearest first. `ways`: its moves, one for each front. */
export function failedStroke(why: WhySituation, ways: readonly number[], formed: number): FailedStroke {
  const { situation, checks } = why;
  const { part, moves, pairs, fits } = situation;
  const fitting = pairs.filter(({ index }) => ways.some((move) => moves[move]?.bends.every((bend) => fits[bend]?.[index]?.ok)));
  const likely = (fitting.length > 0 ? fitting : pairs).slice(0, PAIRS_EXPLAINED);
  const met = ways.flatMap((move) => likely.flatMap((pair): readonly Met[] =>
    stopsOf(situation, checks, move, formed, pair.index).map((stop) => ({ stop, front: part.faces[moves[move]?.front ?? 0]?.id ?? "", pair, halfLength: moves[move]?.halfLength ?? 0 }))));
  const groups = new Map<string, Met[]>();
  for (const one of met) {
    const key = `${one.stop.reason.kind}/${one.stop.hit?.kind ?? ""}/${[...one.stop.reason.faces].sort().join("/")}`;
    groups.set(key, [...(groups.get(key) ?? []), one]);
  }
  const nearest = nearestWay(met);
  const stopsNearest = (group: readonly Met[]) => Math.max(-Infinity, ...group.flatMap((one) => (wayOf(one) === nearest ? [one.stop.off] : [])));
  const least = (group: readonly Met[]) => Math.min(...group.map(({ stop }) => stop.off));
  const reasons = [...groups.values()]
    .sort((a, b) => (stopsNearest(a) === stopsNearest(b) ? least(a) - least(b) : stopsNearest(b) - stopsNearest(a)))
    .map((group) => summedUp(why, group));
  const masks = met.reduce((all, { stop }) => all | (stop.hit?.mask ?? 0), 0);
  return { bends: bendsOf(situation, ways[0] ?? -1), reasons, wouldWork: placesThatWork(why, ways, formed, masks) };
}

const wayOf = ({ front, pair }: Met) => `${front}/${pair.index}`;

/** The front and pair whose gravest stop is the least grave. */
function nearestWay(met: readonly Met[]): string | null {
  const gravest = new Map<string, number>();
  for (const one of met) gravest.set(wayOf(one), Math.max(gravest.get(wayOf(one)) ?? 0, one.stop.off));
  return [...gravest].reduce<readonly [string, number] | null>((best, way) => (best === null || way[1] < best[1] ? way : best), null)?.[0] ?? null;
}

/** One reason for all of them: the worst of what is met, said with the least; of tools that do not fit, the nearest. */
function summedUp({ situation: { units } }: WhySituation, group: readonly Met[]): FailureReason {
  const sorted = [...group].sort((a, b) => a.stop.off - b.stop.off);
  const [least, most] = [sorted[0], sorted[sorted.length - 1]];
  const said = most?.stop.hit ? most : least;
  if (said === undefined || least === undefined) throw new Error("invariant: a group has a member");
  const pairs = new Map(group.map(({ pair: { punch, die } }) => [`${punch.id}/${die.id}`, { punch: punch.id, die: die.id }]));
  const depth = least.stop.hit?.depth;
  const better = depth !== undefined && pairs.size > 1 && said.stop.off - least.stop.off > 0.05
    ? `; nearest with ${least.pair.punch.id} on ${least.pair.die.id}: ${formatLength(Math.round(depth * 10) / 10, units)}` : "";
  return {
    ...drawnReason(said.stop.reason),
    tools: [...new Set(group.flatMap(({ stop }) => stop.reason.tools))],
    message: `${said.stop.reason.message}${stretch(said, units)}${better}`,
    fronts: [...new Set(group.map(({ front }) => readStrip(front)?.bend ?? front))],
    pairs: [...pairs.values()],
    ...(depth === undefined ? {} : { leastDepth: rounded(depth / mmPer(units)) }),
  };
}

/** Which stretch of the line a tool is in the way on, where that is not all of it. */
function stretch({ stop: { hit }, halfLength }: Met, units: LengthUnit): string {
  if (hit === null || (hit.kind !== "punch" && hit.kind !== "die")) return "";
  const [from, to] = [Math.max(-halfLength, hit.z[0]), Math.min(halfLength, hit.z[1])];
  if (from >= to || to - from > 2 * halfLength - FREE_MM) return "";
  const at = (z: number) => formatLength(Math.round(z * 10) / 10, units);
  return `; only from ${at(from)} to ${at(to)}, from the middle of the line`;
}
