import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { currentPieces } from "./currentPieces";
import { sheetDetail } from "./sheetDetail";
import { sheetViewOf } from "./sheetViewOf";
import { visibleSheetStates } from "./visibleSheetStates";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Connection } from "@/db/connection";
import { findPlan } from "@/db/plans/findPlan";
import { findSheet } from "@/db/sheets/findSheet";
import { releaseSheet as releaseSheetRow } from "@/db/sheets/releaseSheet";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { SheetDetail } from "@/lib/schemas/views";

/** Freezes a draft and takes the sheet released before for the same part and machine out of use, both or neither. */
export async function releaseSheet(person: SignedInPerson, id: string): Promise<Result<SheetDetail, Failure>> {
  const db = database();
  const released = await db.transaction((within) => release(within, person, id));
  return released.ok ? ok(foundAgain(await sheetDetail(db, person.role, id))) : released;
}

async function release(within: Connection, person: SignedInPerson, id: string): Promise<Result<null, Failure>> {
  const sheet = await findSheet(within, visibleSheetStates(person.role), id);
  if (!sheet) return fail({ kind: "not-found", message: "There is no such setup sheet." });
  if (sheet.state !== "draft") return fail({ kind: "conflict", message: `Sheet ${sheet.number} is ${sheet.state} already; only a draft is released.` });
  const plan = foundAgain(await findPlan(within, sheet.plan_id));
  const { tools, missing } = await currentPieces(within, plan.plan, plan.tools);
  if (missing.length > 0) {
    return fail({ kind: "conflict", message: `The plan needs pieces that cannot be used now: ${missing.map(({ piece, why }) => `${piece} (${why})`).join(", ")}. Nothing was released; plan the part again, or have the toolroom bring them back.` });
  }
  const done = await releaseSheetRow(within, { id, snapshot: sheetViewOf(sheet, plan, tools), by: person.id });
  if (!done) return fail({ kind: "conflict", message: `Sheet ${sheet.number} was released by somebody else at this moment.` });
  const detail = done.superseded.length > 0 ? `supersedes ${done.superseded.join(", ")}` : "";
  await recordEvent(within, person, "released a setup sheet", `${sheet.number} ${sheet.part_number} rev ${sheet.revision} on ${sheet.machine_name}`, detail);
  return ok(null);
}
