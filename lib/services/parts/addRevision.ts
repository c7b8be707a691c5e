import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { withdrawnProblem } from "../materials/withdrawnProblem";
import { recordEvent } from "../recordEvent";
import { partDetail } from "./partDetail";
import { readPart } from "./readPart";
import { shopOf } from "./shopOf";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findPart } from "@/db/parts/findPart";
import { insertRevision } from "@/db/parts/insertRevision";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { addRevisionSchema } from "@/lib/schemas/partInputs";
import type { PartDetail } from "@/lib/schemas/views";

/** The next revision of a part; refused when somebody else saved one after `basedOn`. */
export async function addRevision(person: SignedInPerson, partId: string, input: z.output<typeof addRevisionSchema>): Promise<Result<PartDetail, Failure>> {
  const db = database();
  const read = readPart(input.document, await shopOf(db, input.document));
  if (!read.ok) return read;
  const before = await findPart(db, partId, input.basedOn);
  const withdrawn = before?.revision.document.material === read.value.materialId ? null : await withdrawnProblem(db, read.value.materialId);
  if (withdrawn) return fail(withdrawn);
  const added = await db.transaction(async (within) => {
    const done = await insertRevision(within, partId, input.basedOn, { ...read.value, note: input.note, by: person.id });
    if (done.kind === "inserted") await recordEvent(within, person, "revised a part", `${done.number} rev ${done.revision} ${read.value.name}`, input.note);
    return done;
  });
  switch (added.kind) {
    case "inserted": return ok(foundAgain(await partDetail(db, person.role, partId)));
    case "no-part": return fail({ kind: "not-found", message: "There is no such part (any more). Nothing was saved." });
    case "stale": return fail({ kind: "conflict", message: staleMessage(input.basedOn, added.latest) });
    default: return added satisfies never;
  }
}

const staleMessage = (basedOn: number, latest: number): string =>
  basedOn > latest
    ? `The part has no revision ${basedOn} yet; its newest is ${latest}. Nothing was saved.`
    : `Revision ${latest} was saved while you were changing revision ${basedOn}. Nothing was saved; open revision ${latest} and make your change there.`;
