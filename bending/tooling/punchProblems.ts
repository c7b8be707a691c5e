import type { FieldProblem } from "../core/problem";
import type { LengthUnit } from "../core/units";
import { formatLength } from "../core/formatLength";
import { PROFILE_TOLERANCE_MM } from "./profileTolerance";
import type { Punch } from "./tool";

/** Where a punch's cross-section and its numbers do not agree: tip at the origin, body above, height as stated. */
export function punchProblems(punch: Punch, path: string, units: LengthUnit): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  const text = (value: number) => formatLength(value, units);
  const lowest = punch.profile.reduce((low, p) => (p[1] < low[1] || (p[1] === low[1] && Math.abs(p[0]) < Math.abs(low[0])) ? p : low));
  const top = Math.max(...punch.profile.map((p) => p[1]));
  if (Math.hypot(lowest[0], lowest[1]) > PROFILE_TOLERANCE_MM) {
    problems.push({
      path: `${path}.profile`,
      message: `a punch's tip must be at the origin with the body above it, but the lowest point is at (${text(lowest[0])}, ${text(lowest[1])}); move the profile by (${text(-lowest[0])}, ${text(-lowest[1])}), and turn it over if the tip is on top`,
    });
  } else if (top < punch.height - PROFILE_TOLERANCE_MM) {
    problems.push({ path: `${path}.height`, message: `is ${text(punch.height)}, but the profile ends ${text(top)} over the tip; draw the body up to its seat, or set the height to ${text(top)}` });
  }
  if (punch.tipAngle >= Math.PI) problems.push({ path: `${path}.tipAngle`, message: "must be under 180 degrees" });
  return problems;
}
