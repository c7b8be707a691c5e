import type { z } from "zod";
import { asPage } from "../asPage";
import { toolListItem } from "./toolListItem";
import { database } from "@/db/client";
import { findTools } from "@/db/tools/findTools";
import type { toolListQuerySchema } from "@/lib/schemas/toolInputs";
import type { Page, ToolListItem } from "@/lib/schemas/views";

export async function listTools(query: z.output<typeof toolListQuerySchema>): Promise<Page<ToolListItem>> {
  return asPage(await findTools(database(), query), query, toolListItem);
}
