import type { z } from "zod";
import { asPage } from "../asPage";
import { sheetListItem } from "./sheetListItem";
import { visibleSheetStates } from "./visibleSheetStates";
import { database } from "@/db/client";
import { findSheets } from "@/db/sheets/findSheets";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { sheetListQuerySchema } from "@/lib/schemas/sheetInputs";
import type { Page, SheetListItem } from "@/lib/schemas/views";

export async function listSheets(person: SignedInPerson, query: z.output<typeof sheetListQuerySchema>): Promise<Page<SheetListItem>> {
  return asPage(await findSheets(database(), visibleSheetStates(person.role), query), query, sheetListItem);
}
