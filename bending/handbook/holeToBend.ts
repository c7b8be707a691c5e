import { MM_PER_INCH, mm, type Mm } from "../core/units";

export type PiercedFeature =
  | { readonly kind: "round" }
  /** A slot that runs along the bend. */
  | { readonly kind: "slot"; readonly length: Mm }
  | { readonly kind: "countersink" }
  | { readonly kind: "counterbore" };

export interface HoleDistance {
  /** From the hole's edge to the inside of the bend. */
  readonly least: Mm;
  /** What the more cautious guide asks for. */
  readonly cautious: Mm;
  readonly source: string;
}

const GUIDES = "stamping design guides";

/**
 * Least distance of a hole to the inside of the bend, so that forming does not pull it out of shape: round 1.5 T + R
 * (another guide 3 T + R); slot along the bend up to 1 in long 2 T + R, to 2 in 2.5 T + R, longer 3 to 3.5 T + R;
 * counterbore or countersink 4 T + R. Stamping design guides.
 */
export function holeToBend(feature: PiercedFeature, thickness: Mm, insideRadius: Mm): HoleDistance {
  const [least, cautious] = timesThickness(feature);
  return { least: mm(least * thickness + insideRadius), cautious: mm(cautious * thickness + insideRadius), source: GUIDES };
}

function timesThickness(feature: PiercedFeature): readonly [number, number] {
  switch (feature.kind) {
    case "round":
      return [1.5, 3];
    case "slot":
      return feature.length <= MM_PER_INCH ? [2, 3] : feature.length < 2 * MM_PER_INCH ? [2.5, 3] : [3, 3.5];
    case "countersink":
    case "counterbore":
      return [4, 4];
    default:
      return feature satisfies never;
  }
}
