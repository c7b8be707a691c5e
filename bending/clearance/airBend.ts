import type { Mm, Rad } from "../core/units";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";
import { fewCounts } from "./fewCounts";
import { POSE_NUMBERS, type StrokeMotion } from "./strokeMotion";
import { strokeSamples } from "./strokeSamples";
import { writePose } from "./writePose";

/** An air bend to `end`, seen from the punch (`die` null) or from the die; in front it is the same as at the back. */
export function airBend(bend: Bend, thickness: Mm, die: Die | null, end: Rad, margin: Mm): StrokeMotion {
  const tables = new Map<number, Float64Array>();
  return {
    angle: (sample, steps) => (end * sample) / steps,
    steps: (reach) => fewCounts(strokeSamples(bend, thickness, die, reach, end, margin)),
    poses: (steps) => {
      const known = tables.get(steps);
      if (known) return known;
      const made = new Float64Array(POSE_NUMBERS * (steps + 1));
      for (let sample = 0; sample <= steps; sample++) writePose(bend, thickness, die, (end * sample) / (2 * steps), made, POSE_NUMBERS * sample);
      tables.set(steps, made);
      return made;
    },
  };
}
