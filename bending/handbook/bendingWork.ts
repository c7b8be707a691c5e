import type { KiloNewton, Mm } from "../core/units";

/** Part of the highest force that the stroke has on average: 0.6 to 0.9; the published example takes 0.75. */
export const WORK_FILL: readonly [number, number] = [0.6, 0.9];

/**
 * Work of one stroke in joules: W = F h m, F the highest force, h the travel, m how full the force-travel diagram is
 * (Oehler, quoted with Lange, Umformtechnik vol. 3, 1990). One kN times one mm is one joule.
 */
export function bendingWork(force: KiloNewton, travel: Mm, fill = 0.75): number {
  return force * travel * fill;
}
