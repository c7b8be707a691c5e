import { deg, toDeg, toRad } from "@/bending/core/units";
import { punchTravel } from "@/bending/handbook/punchTravel";
import { springback } from "@/bending/handbook/springback";
import { bothReadings } from "./bothReadings";
import type { Question } from "./question";

export interface DepthCurve {
  readonly name: string;
  /** Angle turned through in degrees, travel in mm. */
  readonly points: readonly (readonly [number, number])[];
}

export interface DepthCurves {
  readonly curves: readonly DepthCurve[];
  /** On the chosen reading of the V: the angle that is to be left, and the one that the stroke has to reach. */
  readonly aimed: readonly [number, number];
  readonly demanded: readonly [number, number];
}

const MOST = 165;

/** Punch travel over the angle for both ways of naming the V. Beyond the depth where the sheet would pull through, nothing is drawn. */
export function depthCurves(q: Question): DepthCurves | null {
  const back = springback(q.angle, q.insideRadius, q.thickness, q.material);
  const target = toDeg(back.angle);
  if (target > MOST) return null;
  const end = Math.min(MOST, Math.max(120, Math.ceil((target + 15) / 15) * 15));
  const angles = Array.from({ length: end + 1 }, (_, degrees) => degrees);
  const travel = (degrees: number, reading = q.die) => punchTravel(toRad(deg(degrees)), q.insideRadius, q.thickness, reading);
  return {
    curves: bothReadings(q).map(({ die }) => ({ name: die.measured === "between-tops" ? "V by arc tops" : "V by sharp corners", points: angles.map((at) => [at, travel(at, die)] as const) })),
    aimed: [q.degrees, travel(q.degrees)],
    demanded: [target, punchTravel(back.angle, back.radius, q.thickness, q.die)],
  };
}
