import { mm, type Mm, type Rad } from "../core/units";

/**
 * Length of the neutral line through the bend: BA = angle x (r + k t), the angle that is turned through.
 * General sheet-metal texts (Kalpakjian, Groover: chapters on bending).
 */
export function bendAllowance(angle: Rad, insideRadius: Mm, k: number, thickness: Mm): Mm {
  return mm(angle * (insideRadius + k * thickness));
}
