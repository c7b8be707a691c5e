import type { z } from "zod";
import { asPage } from "../asPage";
import { planListItem } from "./planListItem";
import { database } from "@/db/client";
import { findPlans } from "@/db/plans/findPlans";
import type { planListQuerySchema } from "@/lib/schemas/planInputs";
import type { Page, PlanListItem } from "@/lib/schemas/views";

export async function listPlans(query: z.output<typeof planListQuerySchema>): Promise<Page<PlanListItem>> {
  return asPage(await findPlans(database(), query), query, planListItem);
}
