import { materialFields, type MaterialFacts, type MaterialField, type Origin } from "./material";
import { materialRule } from "./materialRule";
import { steelRadiusTable } from "./steelRadiusTable";

type Later = "designation" | "allowance" | "minimumRadii" | "springbackRow" | "origins";

/** A material as it is on record: records made before some values were kept lack those, and have one source for all. */
export type RecordedMaterial = Omit<MaterialFacts, Later> & Partial<Pick<MaterialFacts, Later>> & { readonly source?: string };

/** Fills in what an old record lacks with what the formulas used in those days, so that it goes on giving the same numbers. */
export function completeMaterial(recorded: RecordedMaterial): MaterialFacts {
  const { source, ...facts } = recorded;
  const group = facts.group;
  const one: Origin = { kind: "memory", text: source ?? "not recorded" };
  return {
    ...facts,
    designation: facts.designation ?? facts.id,
    allowance: facts.allowance ?? materialRule(group),
    minimumRadii: facts.minimumRadii === undefined ? (group === "steel" ? steelRadiusTable(facts.tensile[0]) : null) : facts.minimumRadii,
    springbackRow: facts.springbackRow ?? null,
    origins: facts.origins ?? {
      ...(Object.fromEntries(materialFields.map((field) => [field, one])) as Record<MaterialField, Origin>),
      minimumRadii: { kind: "published", text: group === "steel" ? "DIN 6935 (1975-10)" : "none recorded" },
    },
  };
}
