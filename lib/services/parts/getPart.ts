import { partDetail } from "./partDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { PartDetail } from "@/lib/schemas/views";

export async function getPart(person: SignedInPerson, id: string, revision?: number): Promise<Result<PartDetail, Failure>> {
  const part = await partDetail(database(), person.role, id, revision);
  if (part) return ok(part);
  return fail({ kind: "not-found", message: revision === undefined ? "There is no such part." : `There is no such part, or it has no revision ${revision}.` });
}
