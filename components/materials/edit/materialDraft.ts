import { materialFields, type MaterialFacts, type MaterialField, type MaterialGroup, type Origin, type StraightLengthGroup } from "@/bending/handbook/material";

export interface RadiusRowDraft {
  readonly upTo: string;
  readonly across: string;
  readonly along: string;
}

/** A material as it is typed. */
export interface MaterialDraft {
  readonly id: string;
  readonly name: string;
  readonly designation: string;
  readonly standard: string;
  readonly group: MaterialGroup;
  /** MPa, MPa, MPa, GPa, kg/m³. */
  readonly tensileLow: string;
  readonly tensileHigh: string;
  readonly yield: string;
  readonly modulus: string;
  readonly density: string;
  readonly straightLengthGroup: StraightLengthGroup;
  readonly naturalRadiusRatio: string;
  readonly defaultRadiusPerThickness: string;
  readonly rule: MaterialFacts["allowance"]["rule"];
  readonly k: string;
  readonly radiiAs: "none" | "mm" | "thickness";
  readonly radii: readonly RadiusRowDraft[];
  readonly springbackRow: NonNullable<MaterialFacts["springbackRow"]> | "none";
  readonly origins: Readonly<Record<MaterialField, Origin>>;
}

const text = (value: number): string => String(Number(value.toPrecision(10)));

export function materialDraft(facts: MaterialFacts): MaterialDraft {
  const { tensile, allowance, minimumRadii, springbackRow } = facts;
  return {
    id: facts.id, name: facts.name, designation: facts.designation, standard: facts.standard, group: facts.group,
    tensileLow: text(tensile[0]), tensileHigh: text(tensile[1]), yield: text(facts.yield), modulus: text(facts.modulus / 1000), density: text(facts.density),
    straightLengthGroup: facts.straightLengthGroup, naturalRadiusRatio: text(facts.naturalRadiusRatio), defaultRadiusPerThickness: text(facts.defaultRadiusPerThickness),
    rule: allowance.rule, k: allowance.rule === "k" ? text(allowance.k) : "",
    radiiAs: minimumRadii === null ? "none" : minimumRadii.as,
    radii: (minimumRadii?.rows ?? []).map(({ upTo, across, along }) => ({ upTo: text(upTo), across: text(across), along: along === null ? "" : text(along) })),
    springbackRow: springbackRow ?? "none", origins: facts.origins,
  };
}

const unsaid: Origin = { kind: "published", text: "" };

/** Where the choices are from that stand in an empty form; what is typed has yet to say so. */
const chosen: Partial<Record<MaterialField, Origin>> = {
  straightLengthGroup: { kind: "memory", text: "Machinery's Handbook, straight lengths, from memory" },
  defaultRadiusPerThickness: { kind: "memory", text: "one thickness, common practice, no source" },
  allowance: { kind: "published", text: "DIN 6935" },
  minimumRadii: { kind: "memory", text: "not looked up yet" },
  springbackRow: { kind: "published", text: "elastic recovery (Gardiner 1957)" },
};

/** Nothing typed yet. */
export const emptyMaterialDraft: MaterialDraft = {
  id: "", name: "", designation: "", standard: "", group: "steel", tensileLow: "", tensileHigh: "", yield: "", modulus: "", density: "", straightLengthGroup: "medium",
  naturalRadiusRatio: "", defaultRadiusPerThickness: "1", rule: "din6935", k: "", radiiAs: "none", radii: [], springbackRow: "none",
  origins: Object.fromEntries(materialFields.map((field) => [field, chosen[field] ?? unsaid])) as Record<MaterialField, Origin>,
};
