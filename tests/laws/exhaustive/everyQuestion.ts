import { createSituation } from "@/bending/plan/createSituation";
import { createStepChecks } from "@/bending/plan/createStepChecks";
import { partVariants } from "@/bending/plan/partVariants";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { Situation } from "@/bending/plan/situation";
import type { ToolPair } from "@/bending/plan/toolPair";
import type { Interval } from "@/bending/geometry/interval";
import type { Die, Punch, Tool } from "@/bending/tooling/tool";

/** One stroke in one state with one pair, as the geometry answers it. */
export interface Answer {
  readonly halfLength: number;
  readonly forbidden: (tool: Tool) => readonly Interval[];
  /** Names the setting of the back gauge. */
  readonly gauge: string;
  readonly demerit: number;
}

export interface Questions {
  readonly situation: Situation;
  /** Null when the stroke cannot be made, wherever it stands. */
  readonly ask: (move: number, formed: number, pair: number) => Answer | null;
  readonly asked: () => number;
}

/**
 * The questions of a part whose document gives every radius, with every pair of tools that the machine takes. Each is asked once, of checks made
 * for it alone, so that no pattern found for one is used for another.
 */
export function everyQuestion(request: PlanRequest): Questions {
  const { machine } = request;
  const variants = partVariants(request);
  const variant = variants.ok && variants.value.length === 1 ? variants.value[0] : undefined;
  if (!variant) throw new Error("the document gives every radius");
  const punches = request.tools.filter((tool): tool is Punch => tool.kind === "punch" && tool.tang === machine.punchTang && tool.pieces.length > 0);
  const dies = request.tools.filter((tool): tool is Die => tool.kind === "die" && tool.tang === machine.dieTang && tool.pieces.length > 0);
  const { thickness } = variant.part;
  const pairs = punches.flatMap((punch) => dies.filter(({ vOpening }) => vOpening >= 5 * thickness && vOpening <= 20 * thickness).map((die) => ({ punch, die })));
  const situation = createSituation({ variant, machine, units: request.document.units, pairs: pairs.map((pair, index): ToolPair => ({ index, ...pair })), airForceFactor: request.airForceFactor });
  const known = new Map<string, Answer | null>();
  return {
    situation,
    asked: () => known.size,
    ask: (move, formed, pair) => {
      const key = `${move}/${formed}/${pair}`;
      const answer = known.get(key);
      if (answer !== undefined) return answer;
      const found = askOnce(situation, move, formed, pair);
      known.set(key, found);
      return found;
    },
  };
}

function askOnce(situation: Situation, move: number, formed: number, pair: number): Answer | null {
  const { machine, pairs } = situation;
  const halfLength = situation.moves[move]?.halfLength;
  if (!pairs[pair] || halfLength === undefined) throw new Error("a move and a pair of the situation");
  const checks = createStepChecks(situation);
  if (!checks.possible(move, formed, pair)) return null;
  const forbidden = new Map<Tool, readonly Interval[]>();
  const option = checks.gauges(move, formed, pair)[0];
  const [first, last] = [option?.free[0], option?.free[option.free.length - 1]];
  const fingers = !first || !last ? 0 : machine.gauge.fingers > 1 && last[1] - first[0] >= machine.gauge.minSpread ? 2 : 1;
  return {
    halfLength,
    forbidden: (tool) => {
      const found = forbidden.get(tool) ?? checks.forbidden(move, formed, pair, tool);
      forbidden.set(tool, found);
      return found;
    },
    gauge: option === undefined ? "none" : [option.x.toFixed(2), option.slope.toFixed(4), option.r.toFixed(2)].join(),
    demerit: checks.wishes(move, pair) + checks.unkept(move, formed, option) + 2 - fingers,
  };
}
