import { hitSides } from "../clearance/hitSides";
import { formatLength } from "../core/formatLength";
import { clearanceReason } from "./clearanceReason";
import type { StepChecks } from "./createStepChecks";
import { formatBends } from "./formatBends";
import type { PlanReason } from "./planDocument";
import { passesFrames } from "./passesFrames";
import { sheetReach } from "./sheetReach";
import type { Situation } from "./situation";

interface Finding {
  readonly reason: PlanReason;
  /** The least is the nearest to working. */
  readonly off: number;
}

/** Pairs looked at for a reason: the likeliest ones. */
const PAIRS_EXPLAINED = 12;

/**
 * Why no order works: bends that no tool fits, whatever the order; else, for the fullest set of formed bends
 * that can be reached, what stops each of the others, said of the tool that comes nearest.
 */
export function explain(situation: Situation, checks: StepChecks, deadEnds: readonly number[]): readonly PlanReason[] {
  const always = situation.part.bends.flatMap((_, bend) => neverFits(situation, bend));
  if (always.length > 0) return always;
  const formed = deadEnds[0] ?? 0;
  const seen = new Set<string>();
  const reasons: PlanReason[] = [];
  situation.part.bends.forEach((_, bend) => {
    if ((formed >> bend) & 1) return;
    const moves = situation.moves.flatMap((move, index) => (move.bends.includes(bend) && !(move.mask & formed) ? [index] : []));
    const findings = moves.flatMap((move) => situation.pairs.slice(0, PAIRS_EXPLAINED).flatMap(({ index }) => stopsOf(situation, checks, move, formed, index)));
    const nearest = findings.sort((a, b) => a.off - b.off)[0];
    if (nearest === undefined || seen.has(nearest.reason.message)) return;
    seen.add(nearest.reason.message);
    reasons.push(nearest.reason);
  });
  return reasons;
}

/** The nearest tool's problem, when no pair fits a bend; a die of another V than the flat's only when there is none of that one. */
function neverFits({ part, fits }: Situation, bend: number): readonly PlanReason[] {
  const problems = (fits[bend] ?? []).flatMap((fit) => (fit.ok ? [] : [fit.problem]));
  if (problems.length === 0 || problems.length < (fits[bend] ?? []).length) return [];
  const rightV = problems.filter(({ kind }) => kind !== "radius");
  const nearest = [...(rightV.length > 0 ? rightV : problems)].sort((a, b) => a.off - b.off)[0];
  return nearest === undefined ? [] : [{ kind: nearest.kind, bends: [part.bends[bend]?.id ?? ""], faces: [], tools: nearest.tools, message: nearest.message }];
}

/** What stops a move with a pair in a state: the first kind of thing that does, all of it summed up by its worst. */
function stopsOf(situation: Situation, checks: StepChecks, move: number, formed: number, pair: number): readonly Finding[] {
  const { part, machine, moves, pairs, fits, units, clearance } = situation;
  const [found, tools] = [moves[move], pairs[pair]];
  if (found === undefined || tools === undefined) return [];
  const bends = found.bends.map((index) => part.bends[index]?.id ?? "");
  const name = formatBends(bends);
  const reason = (kind: PlanReason["kind"], faces: readonly string[], ids: readonly string[], message: string, off: number): readonly Finding[] =>
    [{ reason: { kind, bends, faces, tools: ids, message }, off }];
  const ofBends = found.bends.map((index) => fits[index]?.[pair]);
  const misfit = ofBends.find((fit) => fit && !fit.ok);
  if (misfit && !misfit.ok) return reason(misfit.problem.kind, [], misfit.problem.tools, misfit.problem.message, 1000 + misfit.problem.off);
  const force = Math.max(...ofBends.map((fit) => (fit?.ok ? fit.force : 0)));
  const needed = Math.max(...ofBends.map((fit) => (fit?.ok ? fit.reach : 0)));
  const total = (force * found.bentLength) / 1000;
  if (total > machine.maxForce) return reason("force", [], [tools.die.id], `${name} needs ${total.toFixed(0)} kN over ${tools.die.id}; ${machine.name} has ${machine.maxForce.toFixed(0)} kN: a wider V would need less`, 100 + total / machine.maxForce);
  const hit = checks.hitOf(move, formed);
  const reach = sheetReach(part, hit);
  const held = Math.min(reach.front, reach.back);
  if (held < needed) {
    const side = hitSides(part, hit);
    const bend = part.bends[found.bends[0] ?? -1];
    const face = bend && (reach.front <= reach.back) === side[bend.parent] ? bend.parent : bend?.child ?? 0;
    return reason("minimum-flange", [part.faces[face]?.id ?? ""], [tools.die.id], `${name}: ${formatLength(held, units)} of level sheet beside the bend line is too short for ${tools.die.id} (V ${formatLength(tools.die.vOpening, units)}); ` +
      `${formatLength(needed, units)} is needed: ${formatLength(needed - held, units)} more flange or a narrower V`, 10 + needed / Math.max(held, 0.1));
  }
  if (!passesFrames(part, hit, reach.back, machine)) {
    return reason("throat", [], [], `${name}: ${formatLength(reach.back, units)} of sheet behind the die does not go between the frames of ${machine.name} (${formatLength(machine.betweenFrames, units)} apart, throat ${formatLength(machine.throatDepth, units)} deep)`, 50);
  }
  const blocked = clearance.blocked(hit, tools.punch, tools.die);
  const met = blocked.length > 0 ? blocked : [tools.punch, tools.die].flatMap((tool) => clearance.evidence(hit, tools.punch, tools.die, tool));
  const worst = [...met].sort((a, b) => b.depth - a.depth)[0];
  if (worst === undefined) return reason("sections", [], [tools.punch.id, tools.die.id], `${name}: no run of real pieces of ${tools.punch.id} and ${tools.die.id} fits the room there is`, 5);
  return [{ reason: clearanceReason({ part, units, bends, pair: [tools.punch.id, tools.die.id] }, worst), off: worst.depth }];
}
