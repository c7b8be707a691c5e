import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { materialLookup } from "../materialLookup";
import { recordEvent } from "../recordEvent";
import { trialView } from "./trialView";
import { fail, ok, type Result } from "@/bending/core/result";
import { findTrialsById } from "@/db/bendTrials/findTrialsById";
import { judgeTrial as judgeRow } from "@/db/bendTrials/judgeTrial";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { judgeTrialSchema } from "@/lib/schemas/bendTableInputs";
import type { TrialView } from "@/lib/schemas/bendTableViews";

const did = { counted: "brought back a bend trial", excluded: "excluded a bend trial", withdrawn: "withdrew a bend trial" } as const;

/** Leaves a trial out of the values, brings it back, or takes it back for good. */
export async function judgeTrial(person: SignedInPerson, id: string, input: z.output<typeof judgeTrialSchema>): Promise<Result<TrialView, Failure>> {
  return database().transaction(async (within): Promise<Result<TrialView, Failure>> => {
    const [before] = await findTrialsById(within, [id]);
    if (!before) return fail({ kind: "not-found", message: "There is no such trial." });
    if (!(await judgeRow(within, id, input, person.id))) {
      return fail({ kind: "conflict", message: `${before.number} was withdrawn, which is for good. Enter the trial anew if it is true after all.` });
    }
    const row = foundAgain((await findTrialsById(within, [id]))[0]);
    await recordEvent(within, person, did[input.state], `${row.number} ${row.material_id}, ${row.nominal_thickness_mm} mm, V ${row.v_opening_mm}`, "reason" in input ? input.reason : "");
    return ok(trialView(row, (await materialLookup(within))(row.material_id)));
  });
}
