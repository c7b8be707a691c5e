import type { Mm } from "../core/units";

/** K = 0.33 below R = 2 t, 0.50 from there (Groover, Fundamentals of Modern Manufacturing, sheet-metal chapter; from memory). */
export function grooverK(insideRadius: Mm, thickness: Mm): number {
  return insideRadius < 2 * thickness ? 0.33 : 0.5;
}
