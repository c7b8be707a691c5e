import type { FieldProblem } from "../core/problem";
import type { LengthUnit } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import { formatLength } from "../core/formatLength";
import type { Machine } from "./machine";
import { profileProblem } from "./profileProblem";
import { PROFILE_TOLERANCE_MM } from "./profileTolerance";

/** Where a machine's cross-sections and numbers do not agree with the machine frame. */
export function machineProblems(machine: Machine, units: LengthUnit): readonly FieldProblem[] {
  const text = (value: number) => formatLength(value, units);
  const problems: FieldProblem[] = [];
  const check = (path: string, profile: readonly ProfilePoint[], seat: number, message: string) => {
    const crossing = profileProblem(profile, units);
    if (crossing) problems.push({ path, message: crossing });
    else if (Math.abs(seat) > PROFILE_TOLERANCE_MM) problems.push({ path, message: `${message}; move the profile by ${text(-seat)}` });
  };
  const ramSeat = Math.min(...machine.ramProfile.map((p) => p[1]));
  const bedSeat = Math.max(...machine.bedProfile.map((p) => p[1]));
  const stop = Math.min(...machine.gauge.fingerProfile.map((p) => p[0]));
  check("ramProfile", machine.ramProfile, ramSeat, `the punch's seat must be at y = 0 with the ram above it, but the lowest point is at y = ${text(ramSeat)}`);
  check("bedProfile", machine.bedProfile, bedSeat, `the die's seat must be at y = 0 with the bed below it, but the highest point is at y = ${text(bedSeat)}`);
  check("gauge.fingerProfile", machine.gauge.fingerProfile, stop, `the stop face must be at x = 0 with the finger behind it, but the foremost point is at x = ${text(stop)}`);
  return problems;
}
