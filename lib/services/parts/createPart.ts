import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { isTaken } from "../isTaken";
import { withdrawnProblem } from "../materials/withdrawnProblem";
import { recordEvent } from "../recordEvent";
import { partDetail } from "./partDetail";
import { readPart } from "./readPart";
import { shopOf } from "./shopOf";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { insertPart } from "@/db/parts/insertPart";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { createPartSchema } from "@/lib/schemas/partInputs";
import type { PartDetail } from "@/lib/schemas/views";

/** A new part with its first revision. */
export async function createPart(person: SignedInPerson, input: z.output<typeof createPartSchema>): Promise<Result<PartDetail, Failure>> {
  const db = database();
  const read = readPart(input.document, await shopOf(db, input.document));
  if (!read.ok) return read;
  const withdrawn = await withdrawnProblem(db, read.value.materialId);
  if (withdrawn) return fail(withdrawn);
  try {
    const id = await db.transaction(async (within) => {
      const part = await insertPart(within, input.number, { ...read.value, note: input.note, by: person.id });
      await recordEvent(within, person, "created a part", `${part.number} ${read.value.name}`, input.note);
      return part.partId;
    });
    return ok(foundAgain(await partDetail(db, person.role, id)));
  } catch (thrown) {
    if (!isTaken(thrown, "parts_number_key")) throw thrown;
    const message = `The number ${input.number} is taken by another part. Choose another, or leave it empty to be given one.`;
    return fail({ kind: "conflict", message, errors: [{ path: "number", message }] });
  }
}
