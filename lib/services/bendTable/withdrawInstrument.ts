import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { instrumentView } from "./instrumentView";
import { fail, ok, type Result } from "@/bending/core/result";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { withdrawInstrument as withdrawRow } from "@/db/bendTrials/withdrawInstrument";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";

/** Takes an instrument out of use. Trials that were measured with it keep it and its uncertainty. */
export async function withdrawInstrument(person: SignedInPerson, id: string, reason: string): Promise<Result<InstrumentView, Failure>> {
  return database().transaction(async (within): Promise<Result<InstrumentView, Failure>> => {
    if (!(await withdrawRow(within, id, reason, person.id))) return fail({ kind: "not-found", message: "There is no such instrument in use." });
    const row = foundAgain((await findInstruments(within)).find((one) => one.id === id));
    await recordEvent(within, person, "withdrew an instrument", row.name, reason);
    return ok(instrumentView(row));
  });
}
