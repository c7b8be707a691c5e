import { sheetDetail } from "./sheetDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { can } from "@/lib/auth/permissions";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { SheetDetail } from "@/lib/schemas/views";

export async function getSheet(person: SignedInPerson, id: string): Promise<Result<SheetDetail, Failure>> {
  const sheet = await sheetDetail(database(), person.role, id);
  if (sheet) return ok(sheet);
  return fail({
    kind: "not-found",
    message: can(person.role, "sheets:drafts") ? "There is no such setup sheet." : "There is no released setup sheet here. If one was, it has been superseded: look in the list for the new one.",
  });
}
