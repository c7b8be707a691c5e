import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { invalid } from "../invalid";
import { recordEvent } from "../recordEvent";
import { changeWords } from "./changeWords";
import { materialDetail } from "./materialDetail";
import { noSuchMaterial } from "./noSuchMaterial";
import { fail, ok, type Result } from "@/bending/core/result";
import { materialProblems } from "@/bending/handbook/materialProblems";
import { database } from "@/db/client";
import { findMaterial } from "@/db/materials/findMaterial";
import { insertMaterialVersion } from "@/db/materials/insertMaterialVersion";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import { materialChanges } from "@/lib/schemas/materialChanges";
import type { updateMaterialSchema } from "@/lib/schemas/materialInputs";
import type { MaterialDetail } from "@/lib/schemas/materialViews";

/** The next version of a material; refused when somebody else made one after `basedOn`, or when nothing is another. */
export async function updateMaterial(person: SignedInPerson, id: string, { basedOn, facts, note }: z.output<typeof updateMaterialSchema>): Promise<Result<MaterialDetail, Failure>> {
  if (facts.id !== id) return fail(invalid("A short name stays: parts are made of it. Nothing was saved.", [{ path: "id", message: `must stay ${id}` }], "facts"));
  const problems = materialProblems(facts);
  if (problems.length > 0) return fail(invalid("Some values must be changed. Nothing was saved.", problems, "facts"));
  const db = database();
  const done = await db.transaction(async (within): Promise<Result<null, Failure>> => {
    const before = await findMaterial(within, id);
    const changes = before ? materialChanges(before.facts, facts) : [];
    if (before?.version === basedOn && changes.length === 0) return fail({ kind: "conflict", message: `Nothing differs from version ${basedOn}. Nothing was saved.` });
    const made = await insertMaterialVersion(within, basedOn, facts, { note, by: person.id });
    if (made.kind === "no-material") return noSuchMaterial(id);
    if (made.kind === "stale") return fail({ kind: "conflict", message: staleMessage(basedOn, made.latest) });
    await recordEvent(within, person, "changed a material", `${id} version ${made.version}`, changeWords(changes, note));
    return ok(null);
  });
  return done.ok ? ok(foundAgain(await materialDetail(db, id))) : done;
}

const staleMessage = (basedOn: number, latest: number): string =>
  basedOn > latest
    ? `The material has no version ${basedOn} yet; its newest is ${latest}. Nothing was saved.`
    : `Version ${latest} was saved while you were changing version ${basedOn}. Nothing was saved; what you entered is still here. Compare it with version ${latest} and make your change there.`;
