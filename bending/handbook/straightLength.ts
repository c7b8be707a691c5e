import { mm, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "./material";

const PER_THICKNESS: Record<MaterialFacts["straightLengthGroup"], number> = { soft: 0.55, medium: 0.64, hard: 0.71 };

/**
 * The three straight-length formulas, L = c T + 1.57 R at 90 degrees and in proportion to the angle turned
 * through: c = 0.55 for soft brass and soft copper, 0.64 for half-hard copper and brass, soft steel and
 * aluminium, 0.71 for bronze, hard copper, cold-rolled and spring steel (Machinery's Handbook, section on
 * bending sheet metal; text from memory).
 */
export function straightLength(group: MaterialFacts["straightLengthGroup"], angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  return mm(((PER_THICKNESS[group] * thickness + 1.57 * insideRadius) * angle) / (Math.PI / 2));
}
