import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { entryContext } from "./entryContext";
import { entryProblems } from "./entryProblems";
import { newTrial } from "./newTrial";
import { trialView } from "./trialView";
import { fail, ok, type Result } from "@/bending/core/result";
import { findTrialsById } from "@/db/bendTrials/findTrialsById";
import { insertTrials } from "@/db/bendTrials/insertTrials";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { addTrialsSchema } from "@/lib/schemas/bendTableInputs";
import type { AddedTrials } from "@/lib/schemas/bendTableViews";

/** Puts in a page of the notebook: every line, or none when one of them cannot be. A line that is sent again is kept once. */
export async function addTrials(person: SignedInPerson, { units, lines }: z.output<typeof addTrialsSchema>): Promise<Result<AddedTrials, Failure>> {
  return database().transaction(async (within): Promise<Result<AddedTrials, Failure>> => {
    const context = await entryContext(within, units, lines);
    const errors = lines.flatMap((line, index) => [
      ...(lines.findIndex(({ id }) => id === line.id) < index ? [{ path: "id", message: "is another line's already" }] : []),
      ...entryProblems(line, context),
    ].map(({ path, message }) => ({ path: `lines[${index}].${path}`, message })));
    if (errors.length > 0) {
      const wrong = new Set(errors.map(({ path }) => path.split(".")[0])).size;
      return fail({ kind: "invalid", message: `${wrong === 1 ? "One line" : `${wrong} lines`} must be changed. Nothing was saved.`, errors });
    }
    const added = await insertTrials(within, lines.map((line) => newTrial(line, units, foundAgain(context.materials(line.material)))), person.id);
    const rows = await findTrialsById(within, lines.map(({ id }) => id));
    const fresh = rows.filter(({ id }) => added.includes(id));
    if (fresh.length > 0) {
      const materials = [...new Set(fresh.map(({ material_id: id }) => id))].join(", ");
      await recordEvent(within, person, "entered bend trials", `${fresh.length} of ${materials}`, fresh.map(({ number }) => number).join(", "));
    }
    return ok({ trials: rows.map((row) => trialView(row, context.materials(row.material_id))), known: lines.length - added.length });
  });
}
