import { rad, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "./material";
import { springbackFactor } from "./springbackFactor";

/** Bisection steps: the bracket of one radius shrinks below rounding noise. */
const HALVINGS = 60;

/**
 * Angle that a bend has to be taken to so that it springs back to `angle` with inside radius `radius`, and the radius under load.
 * By the material's row of the kR table where it has one that reaches this radius over thickness: angle / kR, radius
 * kR (r + t/2) - t/2 (German metal-trades table book). Else by elastic recovery: Ri / Rf = 4 x³ - 3 x + 1 with x = Ri Y / (E t)
 * (Gardiner, Trans. ASME 79, 1957: ideal elastic-plastic pure bending), then angle / Ks with Ks = (2 Ri / t + 1) / (2 Rf / t + 1).
 * Hardening and the die's contact are left out.
 */
export function springback(angle: Rad, radius: Mm, thickness: Mm, material: MaterialFacts): { readonly angle: Rad; readonly radius: Mm } {
  const kR = material.springbackRow === null ? null : springbackFactor(material.springbackRow, radius / thickness);
  const before = kR === null ? beforeRecovery(radius, thickness, material) : kR.factor * (radius + thickness / 2) - thickness / 2;
  const ratio = kR?.factor ?? ((2 * before) / thickness + 1) / ((2 * radius) / thickness + 1);
  return { angle: rad(angle / ratio), radius: before as Mm };
}

function beforeRecovery(radius: Mm, thickness: Mm, material: MaterialFacts): number {
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
  return (low + high) / 2;
}
