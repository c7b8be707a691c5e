import type { z } from "zod";
import { asPage } from "../asPage";
import { sheetFlatChanges } from "../flatChange/sheetFlatChanges";
import { sheetListItem } from "./sheetListItem";
import { visibleSheetStates } from "./visibleSheetStates";
import { database } from "@/db/client";
import { findSheets } from "@/db/sheets/findSheets";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { sheetListQuerySchema } from "@/lib/schemas/sheetInputs";
import type { Page, SheetListItem } from "@/lib/schemas/views";

export async function listSheets(person: SignedInPerson, query: z.output<typeof sheetListQuerySchema>): Promise<Page<SheetListItem>> {
  const db = database();
  const found = await findSheets(db, visibleSheetStates(person.role), query);
  const changes = await sheetFlatChanges(db, found.rows.map((row) => row.id));
  return asPage(found, query, (row) => sheetListItem(row, changes.get(row.id)));
}
