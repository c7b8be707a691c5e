import { mm, type Mm } from "../core/units";

export interface ReliefSize {
  /** Least width, and what some ask for. */
  readonly width: readonly [Mm, Mm];
  /** Least depth past the bend line's outer edge, and with half a millimetre to spare. */
  readonly depth: readonly [Mm, Mm];
}

/** Added to the depth by practice, mm. */
const SPARE = 0.5;

/** Relief where a bend ends next to unbent sheet: width T (some 1.5 T), depth R + T (some + 0.5 mm); from memory. */
export function reliefSize(thickness: Mm, insideRadius: Mm): ReliefSize {
  const depth = insideRadius + thickness;
  return { width: [thickness, mm(1.5 * thickness)], depth: [mm(depth), mm(depth + SPARE)] };
}
