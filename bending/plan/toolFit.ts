import { MEANT_CONTACT_MM } from "../core/tolerance";
import { kiloNewtonPerMetre, toDeg, type LengthUnit } from "../core/units";
import { airBendForce } from "../handbook/airBendForce";
import { naturalRadius } from "../handbook/naturalRadius";
import { vOpeningRule } from "../handbook/vOpeningRule";
import { formatLength } from "../core/formatLength";
import type { Bend, PartModel } from "../part/partModel";
import type { RunsOf } from "../setup/createRuns";
import { levelNeeded } from "../strokes/levelNeeded";
import type { Machine } from "../tooling/machine";
import { hemFit } from "./hemFit";
import { overbent } from "./overbent";
import type { FitProblem, ToolFit } from "./situation";
import type { ToolPair } from "./toolPair";

/** How far the natural radius (or the V, where no radius is asked for) may be off before it counts as a wish unmet. Common practice, no source. */
const WISHED_RATIO = 1.5;
/** Degrees. Angles this near are the same to a tool. */
const SAME_ANGLE_DEG = 0.05;

export interface FitQuestion {
  /** What the formula's air-bend force is multiplied by. */
  readonly airForceFactor: number;
  readonly part: PartModel;
  readonly machine: Machine;
  readonly runs: RunsOf;
  readonly units: LengthUnit;
  /** The V whose natural radius the bend was given, when its radius follows from the die. */
  readonly vOpening: number | null;
  /** Every bend is for that V, also where the document gives its radius: the flat stands on what was measured on it. */
  readonly everyBend: boolean;
}

/** Whether a bend can be formed by a pair, apart from order and clearance; the first thing that is wrong, else. */
export function toolFit(question: FitQuestion, bend: Bend, pair: ToolPair): ToolFit {
  if (bend.hem !== null) return hemFit(question, bend, pair, toolFit);
  const { part } = question;
  const demanded = overbent(part, bend);
  const force = kiloNewtonPerMetre(airBendForce(part.material.tensile[1], part.thickness, pair.die.vOpening) * question.airForceFactor);
  const problem = bedProblem(question, bend) ?? radiusProblem(question, bend, pair) ?? tipProblem(question, bend, pair) ?? angleProblem(bend, toDeg(demanded), pair)
    ?? forceProblem(force, pair) ?? piecesProblem(question, bend, pair);
  if (problem) return { ok: false, problem };
  return { ok: true, wishes: wishes(question, bend, pair), demanded, force, reach: levelNeeded(bend, part.thickness, pair.die) };
}

// Messages are put into words when they are read: most are about pairs that nobody asks for.

/** The die is for another flat, which is asked about by itself: last of all to be told. */
const OTHER_FLAT = 1e6;
/** No tool helps: first to be told. */
const NO_TOOL_HELPS = -1;

/** The bed is too short, whatever stands on it. */
function bedProblem({ machine, units }: FitQuestion, bend: Bend): FitProblem | null {
  const length = lineLength(bend);
  if (length - 2 * machine.settings.maxUncoveredEnd <= machine.bedLength) return null;
  return { kind: "bed", tools: [], off: NO_TOOL_HELPS, get message() { return `bend ${bend.id} is ${formatLength(length, units)} long; the bed of ${machine.name} is ${formatLength(machine.bedLength, units)}`; } };
}

function radiusProblem({ part, units, vOpening, everyBend }: FitQuestion, bend: Bend, { die }: ToolPair): FitProblem | null {
  if (vOpening === null || (bend.radiusSource === "document" && !everyBend) || Math.abs(die.vOpening - vOpening) < 1e-6) return null;
  if (bend.radiusSource === "document") {
    return { kind: "no-die", tools: [die.id], off: OTHER_FLAT, get message() { return `the flat of bend ${bend.id} is for a V ${formatLength(vOpening, units)}, as the shop measured; ${die.id} has ${formatLength(die.vOpening, units)}`; } };
  }
  const gives = naturalRadius(part.material, die.vOpening);
  return {
    kind: "no-die", tools: [die.id], off: OTHER_FLAT,
    get message() { return `the flat of bend ${bend.id} is for the inside radius ${formatLength(bend.insideRadius, units)} of a V ${formatLength(vOpening, units)}; ${die.id} gives ${formatLength(gives, units)}`; },
  };
}

function tipProblem({ units }: FitQuestion, bend: Bend, { punch }: ToolPair): FitProblem | null {
  if (punch.tipRadius <= bend.insideRadius + MEANT_CONTACT_MM) return null;
  return {
    kind: "radius", tools: [punch.id], off: punch.tipRadius / Math.max(bend.insideRadius, 0.01),
    get message() { return `the tip of ${punch.id} has a radius of ${formatLength(punch.tipRadius, units)}, larger than the ${formatLength(bend.insideRadius, units)} inside bend ${bend.id}; ${formatLength(bend.insideRadius, units)} or less is needed`; },
  };
}

function angleProblem(bend: Bend, demanded: number, { punch, die }: ToolPair): FitProblem | null {
  const included = 180 - demanded;
  const sharp = Math.max(toDeg(punch.tipAngle), toDeg(die.vAngle));
  if (included >= sharp - SAME_ANGLE_DEG) return null;
  const tool = toDeg(punch.tipAngle) > toDeg(die.vAngle) ? punch : die;
  return {
    kind: "angle", tools: [tool.id], off: (sharp - included) / 180,
    get message() { return `bend ${bend.id} is taken to ${(180 - demanded).toFixed(1)}° included (${toDeg(bend.angle).toFixed(1)}° turned and its springback); ` +
      `${tool.id} has ${sharp.toFixed(1)}°, ${Math.max(0, included).toFixed(1)}° or less is needed`; },
  };
}

function forceProblem(force: number, { punch, die }: ToolPair): FitProblem | null {
  const weak = punch.maxForcePerMetre < die.maxForcePerMetre ? punch : die;
  if (force <= weak.maxForcePerMetre) return null;
  return { kind: "tool-force", tools: [weak.id], off: force / weak.maxForcePerMetre - 1, get message() { return `${weak.id} is rated ${weak.maxForcePerMetre.toFixed(0)} kN/m; this V needs ${force.toFixed(0)} kN/m`; } };
}

const lineLength = ({ line: [[ax, ay], [bx, by]] }: Bend) => Math.hypot(bx - ax, by - ay);

function piecesProblem({ runs, units }: FitQuestion, bend: Bend, { punch, die }: ToolPair): FitProblem | null {
  const length = lineLength(bend);
  const short = [punch, die].find((tool) => runs(tool, length).length === 0);
  if (short === undefined) return null;
  const have = short.pieces.reduce((sum, piece) => sum + piece.length, 0);
  return {
    kind: "sections", tools: [short.id], off: length / Math.max(1, have),
    get message() { return `bend ${bend.id} is ${formatLength(length, units)} long; the pieces of ${short.id} in service make ${formatLength(have, units)} together`; },
  };
}

function wishes({ part, units, vOpening }: FitQuestion, bend: Bend, { die }: ToolPair): readonly FitProblem[] {
  const found: FitProblem[] = [];
  const asked = bend.radiusSource === "document";
  const gives = naturalRadius(part.material, die.vOpening);
  const ratio = asked ? gives / Math.max(bend.insideRadius, 1e-6) : die.vOpening / vOpeningRule(part.thickness);
  const off = Math.abs(Math.log(ratio));
  if (off > Math.log(WISHED_RATIO) && asked) {
    found.push({ kind: "radius", tools: [die.id], off, get message() { return `${die.id} gives bend ${bend.id} an inside radius of about ${formatLength(gives, units)}; ${formatLength(bend.insideRadius, units)} is asked for, the natural radius of a V ${formatLength(bend.insideRadius / part.material.naturalRadiusRatio, units)}`; } });
  }
  if (off > Math.log(WISHED_RATIO) && !asked && vOpening !== null) {
    found.push({ kind: "tool-choice", tools: [die.id], off, get message() { return `${die.id} has a V of ${formatLength(die.vOpening, units)}; the usual one for ${formatLength(part.thickness, units)} is ${formatLength(vOpeningRule(part.thickness), units)}`; } });
  }
  return found;
}
