import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { isTaken } from "../isTaken";
import { recordEvent } from "../recordEvent";
import { instrumentView } from "./instrumentView";
import { fail, ok, type Result } from "@/bending/core/result";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { insertInstrument } from "@/db/bendTrials/insertInstrument";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { instrumentSchema } from "@/lib/schemas/bendTableInputs";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";

export async function createInstrument(person: SignedInPerson, input: z.output<typeof instrumentSchema>): Promise<Result<InstrumentView, Failure>> {
  const db = database();
  try {
    const id = await db.transaction(async (within) => {
      const made = await insertInstrument(within, input, person.id);
      await recordEvent(within, person, "added an instrument", input.name, `${input.kind}, uncertainty ${input.uncertainty} ${input.kind === "protractor" ? "°" : "mm"}`);
      return made;
    });
    return ok(instrumentView(foundAgain((await findInstruments(db)).find((row) => row.id === id))));
  } catch (thrown) {
    if (!isTaken(thrown, "instruments_name_taken")) throw thrown;
    const message = `There is an instrument named ${input.name} already. Choose another name.`;
    return fail({ kind: "conflict", message, errors: [{ path: "name", message }] });
  }
}
