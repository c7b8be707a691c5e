import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { materialDetail } from "./materialDetail";
import { noSuchMaterial } from "./noSuchMaterial";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findMaterial } from "@/db/materials/findMaterial";
import { setWithdrawn } from "@/db/materials/setWithdrawn";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { withdrawMaterialSchema } from "@/lib/schemas/materialInputs";
import type { MaterialDetail } from "@/lib/schemas/materialViews";

/** Withdraws a material from new parts, or brings it back; parts that are made of it keep working. */
export async function withdrawMaterial(person: SignedInPerson, id: string, { withdrawn, note }: z.output<typeof withdrawMaterialSchema>): Promise<Result<MaterialDetail, Failure>> {
  const db = database();
  const done = await db.transaction(async (within): Promise<Result<null, Failure>> => {
    const material = await findMaterial(within, id);
    if (!material) return noSuchMaterial(id);
    if (!(await setWithdrawn(within, id, withdrawn ? person.id : null))) {
      return fail({ kind: "conflict", message: withdrawn ? `${id} is withdrawn already.` : `${id} is in use; there is nothing to bring back.` });
    }
    await recordEvent(within, person, withdrawn ? "withdrew a material" : "brought a material back", `${id} ${material.facts.name}`, note);
    return ok(null);
  });
  return done.ok ? ok(foundAgain(await materialDetail(db, id))) : done;
}
