import type { FieldProblem } from "../core/problem";
import type { HemKind } from "./partDocument";

interface BendEntry {
  readonly angle: number;
  readonly hem?: HemKind;
  readonly gap?: number;
  readonly insideRadius?: number;
}

/** Whether hem, gap, angle and inside radius of one bend go together. */
export function checkBendEntry(bend: BendEntry, path: string): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  const say = (field: string, message: string) => problems.push({ path: `${path}.${field}`, message });
  const most = bend.hem === "teardrop" ? 270 : 180;
  if (!bend.hem && bend.angle > most) say("angle", "must be over 0 and at most 180 degrees turned through");
  else if (bend.hem === "teardrop" && (bend.angle < 180 || bend.angle > most)) say("angle", `is ${bend.angle}, but a teardrop hem is turned through 180 degrees and on until it closes, 270 at most; give 180 to have it closed`);
  else if (bend.hem && bend.hem !== "teardrop" && bend.angle !== 180) say("angle", `is ${bend.angle}, but a hem is turned through 180 degrees`);
  if (bend.hem === "closed" && (bend.gap ?? 0) > 0) say("gap", 'must be left out: a closed hem has no gap; use "hem": "open"');
  if (bend.hem === "closed" && (bend.insideRadius ?? 0) > 0) say("insideRadius", "must be left out: a closed hem has no inside radius");
  if (bend.hem && bend.hem !== "closed") {
    if (bend.gap === undefined && bend.insideRadius === undefined) say("gap", `is missing: a hem that is ${bend.hem === "open" ? "open" : "a teardrop"} needs the clear gap inside it`);
    else if (bend.gap === 0) say("gap", 'must be more than 0; use "hem": "closed" for a hem without a gap');
    else if (bend.gap !== undefined && bend.insideRadius !== undefined && Math.abs(bend.gap - 2 * bend.insideRadius) > 1e-9) say("insideRadius", "disagrees with the gap, which is twice the inside radius; give one of the two");
  }
  if (!bend.hem && bend.gap !== undefined) say("gap", 'belongs to a hem; give "hem" or leave the gap out');
  return problems;
}
