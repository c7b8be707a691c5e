import { rad, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "./material";

/** Bisection steps: the bracket of one radius shrinks below rounding noise. */
const HALVINGS = 60;

/**
 * Angle that a bend has to be taken to so that it springs back to `angle` with inside radius `radius`.
 * Ri / Rf = 4 x³ - 3 x + 1 with x = Ri Y / (E t) (Gardiner, Trans. ASME 79, 1957: ideal elastic-plastic pure
 * bending), then angle / Ks with Ks = (2 Ri / t + 1) / (2 Rf / t + 1). Hardening and the die's contact are left out.
 */
export function springback(angle: Rad, radius: Mm, thickness: Mm, material: MaterialFacts): { readonly angle: Rad; readonly radius: Mm } {
  const after = (before: number) => {
    const x = (before * material.yield) / (material.modulus * thickness);
    return before / (4 * x ** 3 - 3 * x + 1);
  };
  let [low, high] = [0, radius as number];
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (after(middle) < radius) low = middle;
    else high = middle;
  }
  const before = (low + high) / 2;
  const ratio = ((2 * before) / thickness + 1) / ((2 * radius) / thickness + 1);
  return { angle: rad(angle / ratio), radius: before as Mm };
}
