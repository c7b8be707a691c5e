import type { MaterialFacts } from "@/bending/handbook/material";

/** What is kept of the newest version in the material's own row. */
export const materialColumns = (facts: MaterialFacts) =>
  ({ name: facts.name, material_group: facts.group, standard: facts.standard, facts: JSON.stringify(facts) });
