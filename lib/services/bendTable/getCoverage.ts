import { coverageRows } from "./coverageRows";
import { loadShopTable } from "./loadShopTable";
import { suggestTrials } from "./suggestTrials";
import { fail, ok, type Result } from "@/bending/core/result";
import { findPartUses } from "@/db/bendTrials/findPartUses";
import { database } from "@/db/client";
import { findToolsInService } from "@/db/tools/findToolsInService";
import type { Failure } from "@/lib/api/failure";
import type { CoverageView } from "@/lib/schemas/bendTableViews";

/** Sheet against V of one material: what is measured, what is bridged, and what to bend next. */
export async function getCoverage(material: string): Promise<Result<CoverageView, Failure>> {
  const db = database();
  const { table, materials } = await loadShopTable(db, material);
  const facts = materials(material);
  if (!facts) return fail({ kind: "not-found", message: `"${material}" is not a material of this shop.` });
  const parts = await findPartUses(db, material);
  const uses = parts.map(({ thickness_mm: thickness, bends }) => ({ thicknessMm: Math.round(thickness * 100) / 100, bends }));
  const inService = new Set((await findToolsInService(db)).flatMap((tool) => (tool.kind === "die" ? [tool.vOpening as number] : [])));
  const openings = ordered([...inService, ...table.cells.map(({ vOpening }) => vOpening)]).map((vOpeningMm) => ({ vOpeningMm, inService: inService.has(vOpeningMm) }));
  const thicknesses = ordered([...table.cells.map(({ thickness }) => thickness), ...uses.map(({ thicknessMm }) => thicknessMm)]);
  const rows = coverageRows({ material, table, thicknesses, openings, uses });
  const used = openings.filter((_, index) => rows.some(({ cells }) => cells[index]?.kind !== "unusual"));
  return ok({
    material, materialName: facts.name, openings: used,
    rows: rows.map((row) => ({ ...row, cells: row.cells.filter(({ vOpeningMm }) => used.some((opening) => opening.vOpeningMm === vOpeningMm)) })),
    suggestions: suggestTrials(rows, facts),
  });
}

const ordered = (values: readonly number[]): readonly number[] => [...new Set(values)].sort((a, b) => a - b);
