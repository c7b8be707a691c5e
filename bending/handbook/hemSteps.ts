import { deg, mm, type Deg, type Mm } from "../core/units";

export interface HemSteps {
  /** Hits on one bend line: the acute pre-bend, then the flattening. */
  readonly hits: 2;
  /** Angle left between the legs after the pre-bend; 45 degrees works sometimes. */
  readonly preBendOpening: readonly [Deg, Deg];
  readonly preBendTurned: readonly [Deg, Deg];
  /** A two-stage hem die suits this thickness: 14 gauge, 2.0 mm, and thinner. */
  readonly suitsTwoStageDie: boolean;
  /** Shortest return, 4 t for a closed or an open hem; from memory. */
  readonly returnLength: Mm;
}

/** How a hem is made in two hits (stamping and press-brake guides). Flattening pushes sideways on the tools. */
export function hemSteps(thickness: Mm): HemSteps {
  const [least, most] = [28, 30];
  return {
    hits: 2,
    preBendOpening: [deg(least), deg(most)],
    preBendTurned: [deg(180 - most), deg(180 - least)],
    suitsTwoStageDie: thickness <= 2,
    returnLength: mm(4 * thickness),
  };
}
