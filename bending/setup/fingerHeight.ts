import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { BackGauge } from "../tooling/machine";

/** Height of the stop face of a finger above its rest, mm. */
export function fingerHeight(gauge: BackGauge): number {
  const front = gauge.fingerProfile.filter((p) => Math.abs(p[0]) < MEANT_CONTACT_MM);
  return Math.max(0, ...front.map((p) => p[1]));
}
