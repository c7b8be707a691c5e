import { fail, ok, type Result } from "../core/result";
import type { FieldProblem } from "../core/problem";
import type { MaterialLookup } from "../handbook/material";
import type { PartDocument } from "../part/partDocument";
import type { SharedWay } from "../setup/shared/sharedWish";
import type { Machine } from "../tooling/machine";
import type { Tool } from "../tooling/tool";
import { candidatePairs } from "./candidatePairs";
import { createSituation } from "./createSituation";
import { createStepChecks } from "./createStepChecks";
import { fingerCount } from "./fingerCount";
import type { PlanDocument } from "./planDocument";
import { plannedPart } from "./plannedPart";
import { stepRoom } from "./stepRoom";

export interface WaysQuestion {
  readonly plan: PlanDocument;
  /** The part that was planned. */
  readonly document: PartDocument;
  readonly materials: MaterialLookup;
  readonly tools: readonly Tool[];
  readonly machine: Machine;
  readonly airForceFactor?: number;
}

/**
 * For each step of a plan the tools that can make it where it stands in the order: pairs with the V of the plan's die, so that radius and
 * flat stay, that clear the part, bear the force, hold the sheet and leave the gauge as many fingers. Steps of hems and of
 * bends in several strokes are left to the plan's own tools. A document that is not of the plan is a problem.
 */
export function waysOf({ plan, document, materials, tools, machine, airForceFactor }: WaysQuestion): Result<readonly (readonly SharedWay[])[], readonly FieldProblem[]> {
  const planned = plannedPart(document, materials, plan);
  if (!planned.ok) return planned;
  const { part, drawn, places } = planned.value;
  const openings = new Map(tools.flatMap((tool) => (tool.kind === "die" ? [[tool.id, tool.vOpening as number] as const] : [])));
  const { pairs } = candidatePairs(tools, machine, part.thickness, openings.get(plan.steps[0]?.die ?? "") ?? 0, plan.units);
  const variant = { part, drawn, splits: [], rows: part.bends.map(() => 0), bitsOf: part.bends.map((_, index) => 1 << index), vOpening: null, everyBend: false, wantedV: 0 };
  const situation = createSituation({ variant, machine, units: plan.units, pairs, airForceFactor });
  const checks = createStepChecks(situation);
  let formed = 0;
  const ways: (readonly SharedWay[])[] = [];
  for (const [index, step] of plan.steps.entries()) {
    const { bends, front } = places(step);
    if (bends.some((bend) => bend < 0)) return fail([{ path: `steps[${index}].bends`, message: `the part ${document.name} has no bend ${step.bends.join(" + ")}; give the part that was planned` }]);
    const move = situation.moves.findIndex((one) => one.front === front && one.bends.length === bends.length && bends.every((bend) => one.bends.includes(bend)));
    const plain = step.hit === undefined && step.acuteAngle === undefined && move >= 0;
    ways.push(!plain ? [] : situation.pairs.flatMap((pair): readonly SharedWay[] => {
      if (pair.die.vOpening !== openings.get(step.die) || !checks.possible(move, formed, pair.index)) return [];
      const gauge = checks.gauges(move, formed, pair.index)[0];
      const room = stepRoom(situation, checks, pair, { move, formed });
      if (room === null || (gauge ? fingerCount(gauge, machine.gauge) : 0) < step.gauge.fingers.length) return [];
      return [{ punch: pair.punch.id, die: pair.die.id, punchWindow: room.punch, dieWindow: room.die }];
    }));
    for (const bend of bends) formed |= 1 << bend;
  }
  return ok(ways);
}
