import { mm, type Mm } from "../core/units";

/** V over thickness for the other methods, lowest and highest (trade chart). */
export const methodOpenings = { coining: [5, 5], partial: [12, 15] } as const;

/** V for coining (5 t) or for partial bending, where the sheet touches neither face of the V (12 to 15 t); trade chart. */
export function vOpeningForMethod(thickness: Mm, method: keyof typeof methodOpenings): readonly [Mm, Mm] {
  const [lowest, highest] = methodOpenings[method];
  return [mm(lowest * thickness), mm(highest * thickness)];
}
