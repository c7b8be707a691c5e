import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { MaterialLookup } from "../handbook/material";
import type { BendTrial } from "../shopTable/bendTrial";
import type { ShopTable } from "../shopTable/shopCell";
import { shopTable } from "../shopTable/shopTable";
import { documentProblems } from "../tooling/documentProblems";
import { bendTableSchema } from "./bendTableSchema";

/** The values of a `bend-table/1` document, or every field of a trial that cannot be true. */
export function readBendTable(json: unknown, materials: MaterialLookup): Result<ShopTable, readonly FieldProblem[]> {
  const read = bendTableSchema.safeParse(json);
  if (!read.success) return fail(documentProblems(read.error));
  const { units, instruments } = read.data;
  // Trials are known by their place, so that what is wrong can be found again.
  const trials = read.data.trials.map(({ instruments: own, ...trial }, i): BendTrial => ({
    ...trial, id: `trials[${i}]`, units,
    instruments: { length: own?.length ?? instruments.length, angle: own?.angle ?? instruments.angle, thickness: own?.thickness ?? instruments.thickness, radius: own?.radius ?? instruments.radius },
  }));
  const table = shopTable(trials, materials);
  const problems = table.refused.flatMap(({ trial, problems: wrong }) => wrong.map(({ path, message }) => ({ path: `${trial}.${path}`, message })));
  return problems.length > 0 ? fail(problems) : ok(table);
}
