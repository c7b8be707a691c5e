import type { MaterialFacts, MaterialField, OriginKind } from "@/bending/handbook/material";

export const fieldWords: Readonly<Record<MaterialField, string>> = {
  tensile: "Tensile strength", yield: "Yield or 0.2 % proof strength", modulus: "Elastic modulus", density: "Density", straightLengthGroup: "Straight-length group",
  naturalRadiusRatio: "Natural radius / V opening", defaultRadiusPerThickness: "Usual inside radius / thickness", allowance: "K from", minimumRadii: "Smallest inside radii", springbackRow: "Springback from",
};

export const originWords: Readonly<Record<OriginKind, string>> = { published: "Published", shop: "The shop’s own", memory: "From memory" };

export const ruleWords: Readonly<Record<MaterialFacts["allowance"]["rule"], string>> = {
  din6935: "DIN 6935", machinery: "Straight length by group", faa: "Aircraft repair handbook formula", k: "A K-factor of its own",
};
