import type { FieldProblem } from "../core/problem";
import { deg, toDeg, rad, type LengthUnit } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import { formatLength } from "../core/formatLength";
import { polygonContains } from "../geometry/polygonContains";
import { PROFILE_TOLERANCE_MM, PROFILE_TOLERANCE_RAD } from "./profileTolerance";
import type { Die } from "./tool";

/**
 * Where a die's cross-section and its numbers do not agree. The V's centre on the top plane is the origin; the tops of the
 * shoulder arcs stand at +-vOpening / 2 (a plain corner there is taken for an arc); nothing stands over the arcs.
 */
export function dieProblems(die: Die, path: string, units: LengthUnit): readonly FieldProblem[] {
  const text = (value: number) => formatLength(value, units);
  const at = (field: string, message: string): FieldProblem => ({ path: `${path}.${field}`, message });
  const top = Math.max(...die.profile.map((p) => p[1]));
  const bottom = Math.min(...die.profile.map((p) => p[1]));
  if (Math.abs(top) > PROFILE_TOLERANCE_MM) {
    return [at("profile", `a die's top plane must be at y = 0 with the body below it, but the highest point is at y = ${text(top)}; move the profile by ${text(-top)}, and turn it over if the V is at the bottom`)];
  }
  const problems: FieldProblem[] = [];
  const level = die.profile.filter((p) => Math.abs(p[1]) <= PROFILE_TOLERANCE_MM / 10).map((p) => p[0]);
  const left = Math.max(...level.filter((x) => x <= 0));
  const right = Math.min(...level.filter((x) => x > 0));
  if (!Number.isFinite(left) || !Number.isFinite(right)) return [at("profile", "the V's centre on the top plane must be at the origin, with the top plane on both sides of it")];
  if (Math.abs(left + right) > 2 * PROFILE_TOLERANCE_MM) {
    problems.push(at("profile", `the V's centre on the top plane must be at the origin, but it is at x = ${text((left + right) / 2)}; move the profile by ${text(-(left + right) / 2)}`));
  } else if (Math.abs(right - left - die.vOpening) > 2 * PROFILE_TOLERANCE_MM) {
    problems.push(at("vOpening", `is ${text(die.vOpening)}, but between the tops of the shoulder arcs the profile opens ${text(right - left)}`));
  } else {
    problems.push(...shapeOfV(die, at, text));
  }
  problems.push(...slotProblems(die, at, text));
  if (-bottom < die.height - PROFILE_TOLERANCE_MM) {
    problems.push(at("height", `is ${text(die.height)}, but the profile ends ${text(-bottom)} under the top plane; draw the body down to its seat, or set the height to ${text(-bottom)}`));
  }
  return problems;
}

/** The slot of a hem die must be open in the profile: in front of its end, just over its floor. */
function slotProblems({ flattening, profile, height }: Die, at: (field: string, message: string) => FieldProblem, text: (value: number) => string): readonly FieldProblem[] {
  if (flattening === undefined) return [];
  const { floor, back, opening } = flattening;
  if (floor >= height) return [at("flattening.floor", `is ${text(floor)} under the top plane, but the die is ${text(height)} high`)];
  const inSlot = [opening * 0.1, opening * 0.9].every((over) => !polygonContains(profile, [back - opening / 2, over - floor]));
  if (!inSlot) return [at("flattening.back", `puts the end of the slot at x = ${text(back)}, ${text(floor)} under the top plane, but the profile has no slot of ${text(opening)} there, open to the front`)];
  return [];
}

function shapeOfV(die: Die, at: (field: string, message: string) => FieldProblem, text: (value: number) => string): readonly FieldProblem[] {
  const angle = wallAngle(die);
  if (angle === null) {
    return [at("profile", "has no V below the origin: the top plane must open into the V between the shoulder arcs")];
  }
  if (Math.abs(angle - die.vAngle) > PROFILE_TOLERANCE_RAD) {
    return [at("vAngle", `is ${toDeg(die.vAngle).toFixed(1)} degrees, but the walls of the profile's V stand at ${toDeg(rad(angle)).toFixed(1)} degrees (up to ${deg(1.5)} degrees apart are taken)`)];
  }
  const inside = die.profile.filter((p) => Math.abs(p[0]) < die.vOpening / 2 && p[1] < 0 && p[1] > -die.height + PROFILE_TOLERANCE_MM);
  const proud = Math.max(0, ...inside.map((p) => overShoulder(die, p)));
  if (proud > PROFILE_TOLERANCE_MM) {
    return [at("shoulderRadius", `is ${text(die.shoulderRadius)}, but the profile stands ${text(proud)} over that arc; the arcs leave the top plane at x = ${text(die.vOpening / 2)} on both sides`)];
  }
  return [];
}

/** How far a point inside the V stands over the shoulder arc or over the wall tangent to it, less what a wall within the angle's tolerance may. */
function overShoulder(die: Die, [x, y]: ProfilePoint): number {
  const [dx, dy] = [Math.abs(x) - die.vOpening / 2, y + die.shoulderRadius];
  const half = die.vAngle / 2;
  const besideArc = dx <= 0 && dy >= -dx * Math.tan(half);
  if (besideArc) return Math.hypot(dx, dy) - die.shoulderRadius;
  const overWall = -dx * Math.cos(half) + dy * Math.sin(half) - die.shoulderRadius;
  return overWall - Math.hypot(dx, dy) * Math.tan(PROFILE_TOLERANCE_RAD);
}

/** The angle between the longest edges of the V on the two sides, or null. */
function wallAngle(die: Die): number | null {
  let total = 0;
  for (const side of [-1, 1]) {
    let [longest, slope] = [0, 0];
    die.profile.forEach((p, i) => {
      const q = die.profile[(i + 1) % die.profile.length] ?? p;
      const half = die.vOpening / 2 + PROFILE_TOLERANCE_MM;
      if (side * (p[0] + q[0]) <= 0 || Math.abs(p[0]) > half || Math.abs(q[0]) > half) return;
      const [upper, lower] = p[1] > q[1] ? [p, q] : [q, p];
      const out = Math.abs(upper[0]) - Math.abs(lower[0]);
      const length = Math.hypot(out, upper[1] - lower[1]);
      if (length > longest && out > 0 && upper[1] > lower[1]) [longest, slope] = [length, Math.atan2(out, upper[1] - lower[1])];
    });
    if (longest === 0) return null;
    total += slope;
  }
  return total;
}
