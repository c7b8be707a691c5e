import { formatLength } from "../core/formatLength";
import { kiloNewtonPerMetre } from "../core/units";
import { airBendForce } from "../handbook/airBendForce";
import { faceReach } from "../part/faceReach";
import type { Bend } from "../part/partModel";
import { acuteStage } from "../strokes/acuteHem";
import type { FitProblem, ToolFit } from "./situation";
import type { FitQuestion } from "./toolFit";
import type { ToolPair } from "./toolPair";

/** Times the air-bend force on the same V that closing a hem takes. From memory, no source; published figures run from 3 to 5. */
const FLATTENING_FACTOR = 5;

/** A hem on a pair: the acute stroke is judged as `acute` says, the flattening by the slot of the die. */
export function hemFit(question: FitQuestion, bend: Bend, pair: ToolPair, acute: (question: FitQuestion, bend: Bend, pair: ToolPair) => ToolFit): ToolFit {
  const { part, units } = question;
  const slot = pair.die.flattening;
  const no = (off: number, message: string): ToolFit => ({ ok: false, problem: { kind: "hem", tools: [pair.die.id], off, message } satisfies FitProblem });
  if (slot === undefined) return no(100, `the hem ${bend.id} is flattened after its acute stroke; ${pair.die.id} has no slot that flattens: a two-stage hem die has`);
  const stage = acuteStage(part, bend, pair.die.vOpening);
  if (part.bends.some(({ parent }) => parent === bend.child)) return no(90, `the leg of hem ${bend.id} carries another flange, which the slot of ${pair.die.id} has no room for`);
  const text = (value: number) => formatLength(value, units);
  const leg = faceReach(part.faces[bend.child]?.outline ?? [], bend);
  const stands = leg * Math.sin(stage.angle) + part.thickness + 2 * stage.insideRadius;
  if (stands > slot.opening) return no(stands / slot.opening, `the leg of hem ${bend.id} stands ${text(stands)} high after the acute stroke; the slot of ${pair.die.id} opens ${text(slot.opening)}`);
  const deep = slot.back - Math.min(...pair.die.profile.map(([x]) => x));
  if (leg > deep) return no(leg / deep, `the leg of hem ${bend.id} is ${text(leg)} wide; the slot of ${pair.die.id} is ${text(deep)} deep`);
  const fit = acute({ ...question, vOpening: null, everyBend: false }, stage, pair);
  if (!fit.ok) return fit;
  const force = kiloNewtonPerMetre(FLATTENING_FACTOR * airBendForce(part.material.tensile[1], part.thickness, pair.die.vOpening) * question.airForceFactor);
  if (force > pair.die.maxForcePerMetre) return no(force / pair.die.maxForcePerMetre, `closing the hem ${bend.id} takes about ${force.toFixed(0)} kN/m; ${pair.die.id} is rated ${pair.die.maxForcePerMetre.toFixed(0)} kN/m`);
  return { ...fit, force: kiloNewtonPerMetre(Math.max(fit.force, force)) };
}
