import { isStillUsed } from "../isStillUsed";
import { recordEvent } from "../recordEvent";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { deletePart as deletePartRows } from "@/db/parts/deletePart";
import { findPart } from "@/db/parts/findPart";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";

/** Takes a part away with everything of it, unless a sheet of it was released: the database sees to that. */
export async function deletePart(person: SignedInPerson, id: string): Promise<Result<undefined, Failure>> {
  const db = database();
  const found = await findPart(db, id);
  if (!found) return fail({ kind: "not-found", message: "There is no such part (any more)." });
  try {
    await db.transaction(async (within) => {
      if (await deletePartRows(within, id)) await recordEvent(within, person, "deleted a part", `${found.part.number} ${found.revision.name}`);
    });
    return ok(undefined);
  } catch (thrown) {
    if (!isStillUsed(thrown)) throw thrown;
    return fail({ kind: "conflict", message: `A setup sheet of ${found.part.number} was released, so the part stays on record. Nothing was deleted.` });
  }
}
