import { materialFields, type MaterialFacts, type MaterialField, type Origin } from "./material";
import { materialRule } from "./materialRule";
import { DIN_6935_RADII, materialById } from "./materials";
import { steelRadiusTable } from "./steelRadiusTable";

type Later = "designation" | "allowance" | "minimumRadii" | "springbackRow" | "origins";

/** A material as it is on record: records made before some values were kept lack those, and have one source for all. */
export type RecordedMaterial = Omit<MaterialFacts, Later> & Partial<Pick<MaterialFacts, Later>> & { readonly source?: string };

/**
 * Fills in what an old record lacks with what the formulas used in those days, so that it goes on giving the same numbers. A value
 * that is a built-in one's still is from where that is; any other has the record's one source.
 */
export function completeMaterial(recorded: RecordedMaterial): MaterialFacts {
  const { source, ...facts } = recorded;
  const group = facts.group;
  const whole = {
    ...facts,
    designation: facts.designation ?? materialById(facts.id)?.designation ?? facts.id,
    allowance: facts.allowance ?? materialRule(group),
    minimumRadii: facts.minimumRadii === undefined ? (group === "steel" ? steelRadiusTable(facts.tensile[0]) : null) : facts.minimumRadii,
    springbackRow: facts.springbackRow ?? null,
  };
  const filledIn = facts.minimumRadii === undefined && whole.minimumRadii !== null ? { minimumRadii: DIN_6935_RADII } : {};
  return { ...whole, origins: facts.origins ?? { ...originsOf(whole, { kind: "memory", text: source ?? "not recorded" }), ...filledIn } };
}

function originsOf(facts: Omit<MaterialFacts, "origins">, other: Origin): MaterialFacts["origins"] {
  const builtIn = materialById(facts.id);
  const same = (field: MaterialField) => builtIn && JSON.stringify(builtIn[field]) === JSON.stringify(facts[field]);
  return Object.fromEntries(materialFields.map((field) => [field, same(field) ? builtIn?.origins[field] : other])) as Record<MaterialField, Origin>;
}
