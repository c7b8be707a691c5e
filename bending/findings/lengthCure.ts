import { mmPer, type LengthUnit } from "../core/units";
import type { Cure } from "./finding";

/** Steps that a person would type: 0.1 mm, 0.005 in; common practice, no source. */
const STEP = { mm: 0.1, in: 0.005 } as const;
const PLACES = { mm: 1, in: 3 } as const;

/** A length (mm) to set a field to, rounded away from what is wrong: `up` when more is wanted, `down` when less is. */
export function lengthCure(path: string, wantedMm: number, way: "up" | "down", units: LengthUnit): Cure {
  const step = STEP[units];
  const steps = wantedMm / mmPer(units) / step;
  const whole = way === "up" ? Math.ceil(steps - 1e-7) : Math.floor(steps + 1e-7);
  const value = Number((whole * step).toFixed(PLACES[units]));
  return { path, value, says: `${value} ${units}` };
}
