import type { FieldProblem } from "@/bending/core/problem";
import { fail, ok, type Result } from "@/bending/core/result";
import { kgPerCubicMetre, mm, mpa } from "@/bending/core/units";
import type { MaterialAllowance, MaterialFacts, MinimumRadiusTable } from "@/bending/handbook/material";
import { materialProblems } from "@/bending/handbook/materialProblems";
import { parseNumber } from "@/lib/format/parseNumber";
import { materialDraft, type MaterialDraft } from "./materialDraft";

/** Reads a draft; every field that must change is named by its path. A text that is as `base` wrote it stands for base's exact number. */
export function readMaterialDraft(draft: MaterialDraft, base: MaterialFacts | null): Result<MaterialFacts, readonly FieldProblem[]> {
  const problems: FieldProblem[] = [];
  const first = base === null ? null : materialDraft(base);
  const typed = (text: string, path: string): number => {
    const read = parseNumber(text);
    if (read.ok) return read.value;
    problems.push({ path, message: text.trim() === "" ? "must be given" : read.error });
    return NaN;
  };
  const number = (key: "tensileLow" | "tensileHigh" | "yield" | "modulus" | "density" | "naturalRadiusRatio" | "defaultRadiusPerThickness", path: string, exact: (facts: MaterialFacts) => number, scale = 1): number =>
    (base !== null && first !== null && first[key] === draft[key] ? exact(base) : typed(draft[key], path) * scale);
  for (const key of ["id", "name", "standard"] as const) if (draft[key].trim() === "") problems.push({ path: key, message: "must not be empty" });
  const allowance: MaterialAllowance = draft.rule === "k" ? { rule: "k", k: typed(draft.k, "allowance.k") } : { rule: draft.rule };
  const facts: MaterialFacts = {
    id: draft.id.trim(), name: draft.name.trim(), designation: draft.designation.trim() === "" ? draft.id.trim() : draft.designation.trim(), standard: draft.standard.trim(), group: draft.group,
    tensile: [mpa(number("tensileLow", "tensile[0]", ({ tensile }) => tensile[0])), mpa(number("tensileHigh", "tensile[1]", ({ tensile }) => tensile[1]))],
    yield: mpa(number("yield", "yield", (own) => own.yield)),
    modulus: mpa(number("modulus", "modulus", (own) => own.modulus, 1000)),
    density: kgPerCubicMetre(number("density", "density", (own) => own.density)),
    straightLengthGroup: draft.straightLengthGroup,
    naturalRadiusRatio: number("naturalRadiusRatio", "naturalRadiusRatio", (own) => own.naturalRadiusRatio),
    defaultRadiusPerThickness: number("defaultRadiusPerThickness", "defaultRadiusPerThickness", (own) => own.defaultRadiusPerThickness),
    allowance,
    minimumRadii: draft.radiiAs === "none" ? null : readRadii(draft, draft.radiiAs, typed),
    springbackRow: draft.springbackRow === "none" ? null : draft.springbackRow,
    origins: draft.origins,
  };
  const named = new Set(problems.map(({ path }) => path));
  const all = [...problems, ...materialProblems(facts).filter(({ path }) => !named.has(path))];
  return all.length > 0 ? fail(all) : ok(facts);
}

function readRadii(draft: MaterialDraft, as: MinimumRadiusTable["as"], typed: (text: string, path: string) => number): MinimumRadiusTable {
  return {
    as,
    rows: draft.radii.map(({ upTo, across, along }, row) => ({
      upTo: mm(typed(upTo, `minimumRadii.rows[${row}].upTo`)),
      across: typed(across, `minimumRadii.rows[${row}].across`),
      along: along.trim() === "" ? null : typed(along, `minimumRadii.rows[${row}].along`),
    })),
  };
}
