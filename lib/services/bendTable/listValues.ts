import type { z } from "zod";
import { loadShopTable } from "./loadShopTable";
import { valueItem } from "./valueItem";
import { database } from "@/db/client";
import type { valueListQuerySchema, ValueSort } from "@/lib/schemas/bendTableInputs";
import type { ValueItem } from "@/lib/schemas/bendTableViews";
import type { Page } from "@/lib/schemas/views";

const sortedBy: Readonly<Record<ValueSort, (item: ValueItem) => string | number | null>> = {
  material: ({ material }) => material,
  thickness: ({ thicknessMm }) => thicknessMm,
  vOpening: ({ vOpeningMm }) => vOpeningMm,
  punchRadius: ({ punchRadiusMm }) => punchRadiusMm,
  angle: ({ angleDeg }) => angleDeg,
  deduction: ({ deductionMm }) => deductionMm,
  k: ({ k }) => k,
  insideRadius: ({ radiusMm }) => radiusMm,
  spread: ({ spreadMm }) => spreadMm,
  trials: ({ counted }) => counted,
  lastMeasured: ({ lastMeasured }) => lastMeasured,
};

/** The values page by page. They are computed from the trials, so they are sorted here and not by the database. */
export async function listValues(query: z.output<typeof valueListQuerySchema>): Promise<Page<ValueItem>> {
  const { table, materials } = await loadShopTable(database(), query.material);
  const words = (query.q ?? "").toLowerCase().split(/\s+/).filter((word) => word !== "");
  const found = table.cells
    .map((cell) => valueItem(cell, materials))
    .filter((item) => query.state === undefined || item.state === query.state)
    .filter((item) => words.every((word) => said(item, materials(item.material)?.name ?? "").includes(word)));
  const by = sortedBy[query.sort];
  const sign = query.dir === "asc" ? 1 : -1;
  // The table's own order (material, thickness, V, punch, angle) decides between equals; what has no value stands last.
  const sorted = [...found].sort((a, b) => compare(by(a), by(b), sign));
  const from = (query.page - 1) * query.pageSize;
  return { items: sorted.slice(from, from + query.pageSize), total: sorted.length, page: query.page, pageSize: query.pageSize };
}

const said = (item: ValueItem, name: string): string => `${item.material} ${name} ${item.thicknessMm} v${item.vOpeningMm} r${item.punchRadiusMm} ${item.angleDeg}°`.toLowerCase();

function compare(a: string | number | null, b: string | number | null, sign: number): number {
  if (a === null || b === null) return a === b ? 0 : a === null ? 1 : -1;
  return a < b ? -sign : a > b ? sign : 0;
}
