import type { ToolPair } from "@/bending/plan/toolPair";
import { createSituation, type SituationFacts } from "@/bending/plan/createSituation";
import { createStepChecks } from "@/bending/plan/createStepChecks";
import type { Interval } from "@/bending/geometry/interval";
import type { Tool } from "@/bending/tooling/tool";
import { shortestRun } from "./shortestRun";

/** A stroke made with one pair: how the gauge stands and what is left unmet; null when it cannot be made, alone on the bed. */
export interface AskedStroke { readonly setting: string; readonly demerit: number }

/** mm. The shortest run that counts. */
const SHORTEST_MM = 5;

/**
 * Asks the geometry whether a stroke can be made in a state with a pair, everything made anew for this one question: situation, clearance and
 * checks. Runs are taken as short as pieces and gaps may ever make them, so that more is called possible than a bed allows.
 */
export function askFact(facts: SituationFacts, bends: readonly number[], front: string, formed: number, pair: ToolPair): AskedStroke | null {
  const situation = createSituation({ ...facts, pairs: [{ ...pair, index: 0 }] });
  if (situation.pairs.length === 0) return null;
  const { part, machine, moves } = situation;
  const mask = bends.reduce((bits, bend) => bits | (1 << bend), 0);
  const move = moves.findIndex((one) => one.mask === mask && part.faces[one.front]?.id === front);
  const found = moves[move];
  if (found === undefined) throw new Error("a stroke of the part");
  const checks = createStepChecks(situation);
  if (!checks.possible(move, formed, 0)) return null;
  const need = Math.max(SHORTEST_MM, 2 * found.halfLength - 2 * machine.settings.maxUncoveredEnd);
  for (const tool of [pair.punch, pair.die]) {
    const { length } = shortestRun(tool, need, machine.settings.maxSectionGap);
    if (!Number.isFinite(length) || !stands(length, found.halfLength, need, machine.settings.maxUncoveredEnd, checks.forbidden(move, formed, 0, tool))) return null;
  }
  const option = checks.gauges(move, formed, 0)[0];
  const [first, last] = [option?.free[0], option?.free[option.free.length - 1]];
  const fingers = !first || !last ? 0 : machine.gauge.fingers > 1 && last[1] - first[0] >= machine.gauge.minSpread ? 2 : 1;
  return {
    setting: option === undefined ? "none" : [option.x.toFixed(2), option.slope.toFixed(4), option.r.toFixed(2)].join(),
    demerit: checks.wishes(move, 0) + checks.unkept(move, formed, option) + 2 - fingers,
  };
}

/** Is there a place for a run that covers the line but for its ends, clear of where the tool must not stand? */
function stands(length: number, half: number, need: number, uncovered: number, forbidden: readonly Interval[]): boolean {
  const reach = Math.max(0, length / 2 - half + uncovered, (length - need) / 2);
  const places = [0, -reach, reach, ...forbidden.flatMap(([from, to]) => [from - length / 2, to + length / 2])].filter((at) => Math.abs(at) <= reach + 1e-6);
  return places.some((at) => forbidden.every(([from, to]) => at + length / 2 <= from + 1e-6 || at - length / 2 >= to - 1e-6));
}

/** Everything that the machine and the sheet take together. */
export function everyPair(tools: readonly Tool[], { punchTang, dieTang }: SituationFacts["machine"]): readonly ToolPair[] {
  const punches = tools.filter((tool) => tool.kind === "punch").filter(({ tang, pieces }) => tang === punchTang && pieces.length > 0);
  const dies = tools.filter((tool) => tool.kind === "die").filter(({ tang, pieces }) => tang === dieTang && pieces.length > 0);
  return punches.flatMap((punch) => dies.map((die) => ({ punch, die }))).map((pair, index): ToolPair => ({ index, ...pair }));
}
