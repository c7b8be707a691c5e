import { createRuns } from "../../setup/createRuns";
import { offCentreLimit } from "../../tooling/offCentre";
import { formatBends } from "../formatBends";
import { loadOffset } from "../loadOffset";
import type { PlanReason } from "../planDocument";
import { sheetReach } from "../sheetReach";
import { formatLength } from "../../core/formatLength";
import { mm } from "../../core/units";
import { toolFit } from "../toolFit";
import { storedReason, type StoredContext, type StoredStep } from "./storedContext";

/** kN. A force or a limit that differs by less is the same: places are written to a few thousandths of a millimetre. */
const WRITTEN_FORCE_KN = 0.1;

/** Whether punch and die still suit the bends: angle, tip, force, level sheet for the shoulders, the force where the load is on the bed, daylight. */
export function fitFindings({ part, machine, units, per, airForceFactor }: StoredContext, { step, hit, punch, die }: StoredStep): readonly PlanReason[] {
  const name = formatBends(step.bends);
  const fits = hit.bends.flatMap((index) => {
    const bend = part.bends[index];
    return bend ? [{ bend, fit: toolFit({ part, machine, runs: createRuns(machine.settings), units, vOpening: null, everyBend: false, airForceFactor }, bend, { index: 0, punch, die }) }] : [];
  });
  const misfit = fits.flatMap(({ bend, fit }) => (fit.ok || fit.problem.kind === "sections" ? [] : [storedReason(fit.problem.kind, fit.problem.message, { bends: [bend.id], tools: fit.problem.tools })]));
  if (misfit.length > 0) return misfit;
  const found: PlanReason[] = [];
  const needed = Math.max(0, ...fits.map(({ fit }) => (fit.ok ? fit.reach : 0)));
  const reach = sheetReach(part, hit);
  const held = Math.min(reach.front, reach.back);
  if (held < needed) found.push(storedReason("minimum-flange", `${name}: ${formatLength(mm(held), units)} of level sheet beside the bend line is too short for ${die.id}; ${formatLength(mm(needed), units)} is needed`, { bends: step.bends, tools: [die.id] }));
  const away = ((step.bendZ[0] + step.bendZ[1]) / 2) * per + loadOffset(part, hit);
  const limit = offCentreLimit(machine, away);
  if (step.forceKN > machine.maxForce) found.push(storedReason("force", `${name} needs ${step.forceKN.toFixed(0)} kN; ${machine.name} has ${machine.maxForce.toFixed(0)} kN`, { bends: step.bends }));
  else if (step.forceKN > limit + WRITTEN_FORCE_KN) {
    found.push(storedReason("force", `${name} needs ${step.forceKN.toFixed(0)} kN ${formatLength(mm(Math.abs(away)), units)} from the middle of the bed; ${machine.name} bears ${limit.toFixed(0)} kN there`, { bends: step.bends }));
  }
  const open = machine.daylight - punch.height - die.height - part.thickness;
  if (open < 0) found.push(storedReason("daylight", `${name}: ${punch.id} and ${die.id} are ${formatLength(mm(-open), units)} too high for the daylight of ${machine.name}`, { bends: step.bends, tools: [punch.id, die.id] }));
  return found;
}
