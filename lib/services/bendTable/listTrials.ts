import type { z } from "zod";
import { asPage } from "../asPage";
import { materialLookup } from "../materialLookup";
import { trialView } from "./trialView";
import { findTrials } from "@/db/bendTrials/findTrials";
import { database } from "@/db/client";
import type { trialListQuerySchema } from "@/lib/schemas/bendTableInputs";
import type { TrialView } from "@/lib/schemas/bendTableViews";
import type { Page } from "@/lib/schemas/views";

export async function listTrials(query: z.output<typeof trialListQuerySchema>): Promise<Page<TrialView>> {
  const db = database();
  const materials = await materialLookup(db);
  return asPage(await findTrials(db, query), query, (row) => trialView(row, materials(row.material_id)));
}
