import type { z } from "zod";
import { asPage } from "../asPage";
import { partFlatChanges } from "../flatChange/partFlatChanges";
import { database } from "@/db/client";
import { findParts } from "@/db/parts/findParts";
import type { partListQuerySchema } from "@/lib/schemas/partInputs";
import type { Page, PartListItem } from "@/lib/schemas/views";

export async function listParts(query: z.output<typeof partListQuerySchema>): Promise<Page<PartListItem>> {
  const db = database();
  const found = await findParts(db, query);
  const changes = await partFlatChanges(db, { partIds: found.rows.map((row) => row.id) });
  return asPage(found, query, (row) => ({
    id: row.id,
    number: row.number,
    name: row.name,
    material: row.material_id,
    thicknessMm: row.thickness_mm,
    bends: row.bends,
    flatWidthMm: row.flat_width_mm,
    flatDepthMm: row.flat_depth_mm,
    revision: row.revision,
    releasedSheets: row.released_sheets,
    flatChange: changes.get(row.id) ?? null,
    updatedAt: row.updated_at.toISOString(),
    updatedBy: row.updated_by ?? "",
  }));
}
