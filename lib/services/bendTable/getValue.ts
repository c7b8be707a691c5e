import { handbookFor } from "./handbookFor";
import { loadShopTable } from "./loadShopTable";
import { trialView } from "./trialView";
import { valueItem } from "./valueItem";
import { fail, ok, type Result } from "@/bending/core/result";
import { findPartUses } from "@/db/bendTrials/findPartUses";
import { database } from "@/db/client";
import { findLastShopUse } from "@/db/plans/findLastShopUse";
import type { Failure } from "@/lib/api/failure";
import type { ValueDetail } from "@/lib/schemas/bendTableViews";

/** Thickness of a part that belongs to a nominal thickness, as a part of it. Own choice: what the values themselves count as one. */
const SAME_THICKNESS = 0.02;

/** One value with its trials, what the handbook says of the same bend, and the parts of that sheet. */
export async function getValue(key: string): Promise<Result<ValueDetail, Failure>> {
  const db = database();
  const { trials, table, materials } = await loadShopTable(db);
  const cell = table.cells.find((one) => one.key === key);
  const material = cell && materials(cell.material);
  if (!cell || !material) return fail({ kind: "not-found", message: "There is no such value: none of its trials is left." });
  const here = new Map(cell.trials.map((trial) => [trial.id, trial]));
  const uses = await findPartUses(db, cell.material);
  const used = await findLastShopUse(db, cell);
  const { radius, deduction, k, source } = handbookFor(cell, material);
  return ok({
    ...valueItem(cell, materials),
    materialName: material.name,
    spreadK: cell.value?.spreadK ?? null,
    outliersTold: cell.outliersTold,
    handbook: { radiusMm: radius, deductionMm: deduction, k, source },
    trials: trials.flatMap((row) => {
      const placed = here.get(row.id);
      return placed === undefined ? [] : [{ ...trialView(row, material), deductionHereMm: placed.deductionHere, kHere: placed.k, score: placed.score, outlier: placed.outlier }];
    }),
    lastUsed: used === undefined ? null : { at: used.planned_at.toISOString(), partId: used.part_id, partNumber: used.part_number },
    parts: uses.filter((part) => Math.abs(part.thickness_mm / cell.thickness - 1) <= SAME_THICKNESS).map(({ id, number, name, bends }) => ({ id, number, name, bends })),
  });
}
