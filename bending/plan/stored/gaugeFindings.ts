import { formatLength } from "../../core/formatLength";
import { mm } from "../../core/units";
import { fingerMeetsTools } from "../../setup/fingerMeetsTools";
import { gaugeOptions } from "../../setup/gaugeOptions";
import { formatBends } from "../formatBends";
import type { PlanReason } from "../planDocument";
import { storedReason, type StoredContext, type StoredStep } from "./storedContext";

/** mm. A finger that the part is this near to touches it: what a gauge holds. */
const TOUCHES_MM = 0.02;

/** Whether the fingers can stand where the plan has them, touch the sheet there and are clear of part and tools. A step gauged by hand has none. */
export function gaugeFindings({ part, machine, per, units }: StoredContext, { step, hit, punch, die }: StoredStep): readonly PlanReason[] {
  const { gauge } = machine;
  const { fingers } = step.gauge;
  if (fingers.length === 0) return [];
  const say = (message: string): PlanReason => storedReason("gauge", `${formatBends(step.bends)}: ${message}`, { bends: step.bends });
  const out = (["x", "r", "z"] as const).flatMap((axis) => {
    const [least, most] = gauge[axis];
    const far = fingers.map((finger) => finger[axis] * per).find((value) => value < least - TOUCHES_MM || value > most + TOUCHES_MM);
    return far === undefined ? [] : [say(`the gauge would stand at ${axis.toUpperCase()} ${formatLength(mm(far), units)}; it travels from ${formatLength(least, units)} to ${formatLength(most, units)}`)];
  });
  if (out.length > 0) return out;
  if (fingers.length > gauge.fingers) return [say(`${fingers.length} fingers were planned; ${machine.name} has ${gauge.fingers}`)];
  const places = fingers.map(({ z }) => z * per).sort((a, b) => a - b);
  const spread = (places[places.length - 1] ?? 0) - (places[0] ?? 0);
  if (fingers.length > 1 && spread < gauge.minSpread - TOUCHES_MM) return [say(`the fingers stand ${formatLength(mm(spread), units)} apart; at least ${formatLength(gauge.minSpread, units)} is needed`)];
  const middle = ((step.bendZ[0] + step.bendZ[1]) / 2) * per;
  const options = gaugeOptions(part, hit, machine);
  const touches = fingers.every((finger) => options.some((option) => {
    const z = finger.z * per - middle;
    const near = Math.abs(option.x + option.slope * z - finger.x * per) <= TOUCHES_MM && Math.abs(option.r - finger.r * per) <= TOUCHES_MM;
    return near && option.free.some(([from, to]) => z >= from - TOUCHES_MM && z <= to + TOUCHES_MM);
  }));
  if (!touches) return [say(`the fingers do not touch ${step.gauge.face} freely at X ${formatLength(mm(step.gauge.x * per), units)}`)];
  return fingers.some((finger) => fingerMeetsTools(finger.x * per, finger.r * per, part.thickness, punch, die, machine)) ? [say(`a finger stands in ${punch.id}, ${die.id}, the ram or the bed`)] : [];
}
