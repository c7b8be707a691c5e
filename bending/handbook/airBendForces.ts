import { kiloNewtonPerMetre, type KiloNewtonPerMetre, type MPa, type Mm } from "../core/units";
import { airBendForce } from "./airBendForce";

export interface PublishedForce {
  readonly source: string;
  readonly formula: string;
  readonly perMetre: KiloNewtonPerMetre;
}

export interface AirBendForces {
  readonly forms: readonly PublishedForce[];
  /** (highest - lowest) / lowest. */
  readonly spread: number;
}

/**
 * The published forms of the air-bend force side by side. They lie about 20 % apart; `airBendForce` takes
 * Oehler's, because it alone states where it holds (5 <= V / t <= 20), is the most cautious up to
 * V / t = 9.5, and so errs on the safe side of a tool's rating in a usual V.
 */
export function airBendForces(tensile: MPa, thickness: Mm, vOpening: Mm): AirBendForces {
  const plain = (tensile * thickness * thickness) / vOpening;
  const forms: readonly PublishedForce[] = [
    { source: "Groover; Kalpakjian (V die, upper end of 1.2 to 1.33)", formula: "1.33 Rm t² L / V", perMetre: kiloNewtonPerMetre(1.33 * plain) },
    { source: "trade formula", formula: "1.42 Rm t² L / V", perMetre: kiloNewtonPerMetre(1.42 * plain) },
    { source: "Oehler, quoted with Lange, Umformtechnik vol. 3, 1990", formula: "(1 + 4 t / V) Rm t² L / V", perMetre: airBendForce(tensile, thickness, vOpening) },
  ];
  const values = forms.map(({ perMetre }) => perMetre as number);
  return { forms, spread: Math.max(...values) / Math.min(...values) - 1 };
}
