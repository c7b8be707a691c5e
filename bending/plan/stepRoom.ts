import { machineFrames } from "../clearance/machineFrames";
import { rad } from "../core/units";
import { applyFrame } from "../geometry/applyFrame";
import { freeIntervals } from "../geometry/freeIntervals";
import type { Interval } from "../geometry/interval";
import type { OrderStep } from "../order/orderProblem";
import type { StepChecks } from "./createStepChecks";
import type { Situation } from "./situation";
import type { ToolPair } from "./toolPair";

/** What a step needs of any bed, mm from the middle of its line: where its punch and its die may stand, and where the part lies. */
export interface StepRoom {
  readonly punch: Interval;
  readonly die: Interval;
  readonly sheet: Interval;
}

/**
 * Windows round the line as far as a bed reaches either way; null when a tool must not stand over the middle of the line, as
 * between tabs. The part turns about lines along the bed, so where it lies along it is the same all through the stroke.
 */
export function stepRoom({ part, machine }: Situation, checks: StepChecks, { index, punch, die }: ToolPair, { move, formed }: Pick<OrderStep, "move" | "formed">): StepRoom | null {
  const anywhere: Interval = [-machine.bedLength, machine.bedLength];
  const round = (tool: typeof punch | typeof die) => freeIntervals(anywhere, checks.forbidden(move, formed, index, tool)).find(([from, to]) => from < 0 && to > 0);
  const [above, below] = [round(punch), round(die)];
  if (above === undefined || below === undefined) return null;
  const frames = machineFrames(part, checks.hitOf(move, formed), rad(0), punch, die);
  const at = part.faces.flatMap(({ outline }, face) => outline.flatMap((p) => {
    const frame = frames[face];
    return frame ? [0, part.thickness].map((height) => applyFrame(frame, [p[0], p[1], height])[2]) : [];
  }));
  return { punch: above, die: below, sheet: [Math.min(...at), Math.max(...at)] };
}
