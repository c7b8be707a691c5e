import type { ClearanceHit } from "../clearance/clearance";
import { hitSides } from "../clearance/hitSides";
import { formatLength } from "../core/formatLength";
import { clearanceReason } from "./clearanceReason";
import type { StepChecks } from "./createStepChecks";
import { formatBends } from "./formatBends";
import { passesFrames } from "./passesFrames";
import type { PlanReason } from "./planDocument";
import { sheetReach } from "./sheetReach";
import type { Situation } from "./situation";

/** One thing that stops a stroke with one pair. */
export interface Stop {
  readonly reason: PlanReason;
  /** The least is the nearest to working. */
  readonly off: number;
  /** What is met, when it is a matter of room. */
  readonly hit: ClearanceHit | null;
}

/**
 * Everything that stops a move with a pair in a state, the gravest kind first: tools that do not fit (then nothing else is asked), force, level sheet,
 * frames; what the part meets, deepest first. Where it meets a tool only somewhere along the line, that counts once no run of pieces fits beside it.
 */
export function stopsOf(situation: Situation, checks: StepChecks, move: number, formed: number, pair: number): readonly Stop[] {
  const { part, machine, moves, pairs, fits, units, clearance } = situation;
  const [found, tools] = [moves[move], pairs[pair]];
  if (found === undefined || tools === undefined) return [];
  const bends = found.bends.map((index) => part.bends[index]?.id ?? "");
  const name = formatBends(bends);
  const stops: Stop[] = [];
  const say = (kind: PlanReason["kind"], faces: readonly string[], ids: readonly string[], message: string, off: number) =>
    stops.push({ reason: { kind, bends, faces, tools: ids, message }, off, hit: null });
  const ofBends = found.bends.map((index) => fits[index]?.[pair]);
  const misfit = ofBends.find((fit) => fit && !fit.ok);
  if (misfit && !misfit.ok) {
    say(misfit.problem.kind, [], misfit.problem.tools, misfit.problem.message, 1000 + misfit.problem.off);
    return stops;
  }
  const force = Math.max(...ofBends.map((fit) => (fit?.ok ? fit.force : 0)));
  const needed = Math.max(...ofBends.map((fit) => (fit?.ok ? fit.reach : 0)));
  const total = (force * found.bentLength) / 1000;
  if (total > machine.maxForce) say("force", [], [tools.die.id], `${name} needs ${total.toFixed(0)} kN over ${tools.die.id}; ${machine.name} has ${machine.maxForce.toFixed(0)} kN: a wider V would need less`, 100 + total / machine.maxForce);
  const hit = checks.hitOf(move, formed);
  const reach = sheetReach(part, hit);
  const held = Math.min(reach.front, reach.back);
  if (held < needed) {
    const side = hitSides(part, hit);
    const bend = part.bends[found.bends[0] ?? -1];
    const face = bend && (reach.front <= reach.back) === side[bend.parent] ? bend.parent : bend?.child ?? 0;
    say("minimum-flange", [part.faces[face]?.id ?? ""], [tools.die.id], `${name}: ${formatLength(held, units)} of level sheet beside the bend line is too short for ${tools.die.id} (V ${formatLength(tools.die.vOpening, units)}); ` +
      `${formatLength(needed, units)} is needed: ${formatLength(needed - held, units)} more flange or a narrower V`, 10 + needed / Math.max(held, 0.1));
  }
  if (!passesFrames(part, hit, reach.back, machine)) {
    say("throat", [], [], `${name}: ${formatLength(reach.back, units)} of sheet behind the die does not go between the frames of ${machine.name} (${formatLength(machine.betweenFrames, units)} apart, throat ${formatLength(machine.throatDepth, units)} deep)`, 50);
  }
  const deepest = (hits: readonly ClearanceHit[]) => [...hits].sort((a, b) => b.depth - a.depth)
    .forEach((one) => stops.push({ reason: clearanceReason({ part, units, bends, pair: [tools.punch.id, tools.die.id] }, one), off: one.depth, hit: one }));
  deepest(clearance.blocked(hit, tools.punch, tools.die));
  if (stops.length > 0) return stops;
  deepest([tools.punch, tools.die].flatMap((tool) => clearance.evidence(hit, tools.punch, tools.die, tool)));
  if (stops.length === 0) say("sections", [], [tools.punch.id, tools.die.id], `${name}: no run of real pieces of ${tools.punch.id} and ${tools.die.id} fits the room there is`, 5);
  return stops;
}
