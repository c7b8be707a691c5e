import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { invalid } from "../invalid";
import { isTaken } from "../isTaken";
import { recordEvent } from "../recordEvent";
import { materialDetail } from "./materialDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { materialProblems } from "@/bending/handbook/materialProblems";
import { database } from "@/db/client";
import { insertMaterial } from "@/db/materials/insertMaterial";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { createMaterialSchema } from "@/lib/schemas/materialInputs";
import type { MaterialDetail } from "@/lib/schemas/materialViews";

/** A new material, version 1. */
export async function createMaterial(person: SignedInPerson, { facts, note }: z.output<typeof createMaterialSchema>): Promise<Result<MaterialDetail, Failure>> {
  const problems = materialProblems(facts);
  if (problems.length > 0) return fail(invalid("Some values must be changed. Nothing was saved.", problems, "facts"));
  const db = database();
  try {
    await db.transaction(async (within) => {
      await insertMaterial(within, facts, { note, by: person.id });
      await recordEvent(within, person, "added a material", `${facts.id} ${facts.name}`, note);
    });
  } catch (thrown) {
    if (!isTaken(thrown, "materials_pkey")) throw thrown;
    const message = `The short name ${facts.id} is another material's already. Choose another.`;
    return fail({ kind: "conflict", message, errors: [{ path: "facts.id", message }] });
  }
  return ok(foundAgain(await materialDetail(db, facts.id)));
}
