import type { z } from "zod";
import { asPage } from "../asPage";
import { database } from "@/db/client";
import { findParts } from "@/db/parts/findParts";
import type { partListQuerySchema } from "@/lib/schemas/partInputs";
import type { Page, PartListItem } from "@/lib/schemas/views";

export async function listParts(query: z.output<typeof partListQuerySchema>): Promise<Page<PartListItem>> {
  return asPage(await findParts(database(), query), query, (row) => ({
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
    updatedAt: row.updated_at.toISOString(),
    updatedBy: row.updated_by ?? "",
  }));
}
