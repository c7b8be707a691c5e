import { kiloNewtonPerMetre, type KiloNewtonPerMetre } from "../core/units";
import { publishedMethodFactors, type BendMethod } from "./forceMethods";

export interface ForceRange {
  readonly lowest: KiloNewtonPerMetre;
  readonly highest: KiloNewtonPerMetre;
}

/** Lowest and highest force that any published factor gives for a method; factors over bottoming go with bottoming's own ends. */
export function methodForceRange(air: KiloNewtonPerMetre, method: BendMethod): ForceRange {
  const range = method === "air" ? [1, 1] as const : factorRange(method);
  return { lowest: kiloNewtonPerMetre(air * range[0]), highest: kiloNewtonPerMetre(air * range[1]) };
}

function factorRange(method: "bottoming" | "coining"): readonly [number, number] {
  const ends = publishedMethodFactors.filter((entry) => entry.method === method).map(({ factor, over }) => {
    const base = over === "air" ? [1, 1] as const : factorRange("bottoming");
    return [factor[0] * base[0], factor[1] * base[1]] as const;
  });
  return [Math.min(...ends.map(([low]) => low)), Math.max(...ends.map(([, high]) => high))];
}
