import { formatLength } from "../../core/formatLength";
import { WRITTEN_PLACE_MM } from "../../core/tolerance";
import { mm } from "../../core/units";
import type { PlanReason } from "../planDocument";
import { clearanceReason } from "../clearanceReason";
import { formatBends } from "../formatBends";
import { passesFrames } from "../passesFrames";
import { sheetReach } from "../sheetReach";
import { fitFindings } from "./fitFindings";
import { gaugeFindings } from "./gaugeFindings";
import { stationSpans } from "./stationSpans";
import { storedReason, type StoredContext, type StoredStep } from "./storedContext";

/** All that is wrong with a step of a stored plan: tools and force, frames, gauge, the run over the bend, and every tool on the bed by a fresh clearance. */
export function stepFindings(context: StoredContext, stored: StoredStep): readonly PlanReason[] {
  return [...fitFindings(context, stored), ...frameFindings(context, stored), ...coverFindings(context, stored), ...clearanceFindings(context, stored), ...gaugeFindings(context, stored)];
}

function frameFindings({ part, machine, units }: StoredContext, { hit, step }: StoredStep): readonly PlanReason[] {
  const { back } = sheetReach(part, hit);
  if (passesFrames(part, hit, back, machine)) return [];
  return [storedReason("throat", `${formatBends(step.bends)}: ${formatLength(mm(back), units)} of sheet behind the die does not go between the frames of ${machine.name}`, { bends: step.bends })];
}

/** The punch and the die must reach along the bend, within the settings for open ends and gaps. */
function coverFindings({ plan, machine, per, units }: StoredContext, { step }: StoredStep): readonly PlanReason[] {
  const station = plan.stations.find(({ id }) => id === step.station);
  const say = (message: string): PlanReason => storedReason("sections", `${formatBends(step.bends)}: ${message}`, { bends: step.bends });
  if (!station) return [say(`the plan has no station ${step.station}`)];
  const { maxUncoveredEnd, maxSectionGap } = machine.settings;
  return [[station.punch, station.punchSections], [station.die, station.dieSections]].flatMap(([tool, sections]) => {
    const spans = typeof sections === "string" || sections === undefined ? [] : stationSpans(station.from, sections);
    const [first, last] = [spans[0], spans[spans.length - 1]];
    if (!first || !last) return [say(`station ${station.id} has no piece of ${String(tool)}`)];
    const open = Math.max(first[0] - step.bendZ[0], step.bendZ[1] - last[1]) * per;
    const gap = Math.max(0, ...spans.slice(1).map(([from], index) => (from - (spans[index]?.[1] ?? from)) * per));
    return [
      ...(open > maxUncoveredEnd + WRITTEN_PLACE_MM ? [say(`${String(tool)} leaves ${formatLength(mm(open), units)} of an end uncovered; ${formatLength(maxUncoveredEnd, units)} is allowed`)] : []),
      ...(gap > maxSectionGap + WRITTEN_PLACE_MM ? [say(`the pieces of ${String(tool)} stand ${formatLength(mm(gap), units)} apart; ${formatLength(maxSectionGap, units)} is allowed`)] : []),
    ];
  });
}

function clearanceFindings(context: StoredContext, { step, hit, punch, die }: StoredStep): readonly PlanReason[] {
  const { plan, part, clearance, units, per, toolOf } = context;
  const frame = { part, units, bends: step.bends, pair: [punch.id, die.id] };
  const middle = ((step.bendZ[0] + step.bendZ[1]) / 2) * per;
  const blocked = clearance.blocked(hit, punch, die).map((found) => clearanceReason(frame, found));
  const met = plan.stations.flatMap((station) => ([[station.punch, station.punchSections], [station.die, station.dieSections]] as const).flatMap(([id, sections]) => {
    const tool = toolOf(id);
    if (tool === undefined) return [];
    const forbidden = clearance.forbidden(hit, punch, die, tool);
    const stands = stationSpans(station.from, sections).some(([from, to]) => forbidden.some(([a, b]) => a + middle < to * per - WRITTEN_PLACE_MM && b + middle > from * per + WRITTEN_PLACE_MM));
    if (!stands) return [];
    const found = clearance.evidence(hit, punch, die, tool).filter(({ z: [a, b] }) => a + middle < station.to * per && b + middle > station.from * per);
    const worst = [...found].sort((a, b) => b.depth - a.depth)[0];
    return worst ? [clearanceReason(frame, worst)]
      : [storedReason("clearance", `${formatBends(step.bends)}: ${id} of station ${station.id} stands where it must not`, { bends: step.bends, tools: [id] })];
  }));
  return [...blocked, ...met];
}
