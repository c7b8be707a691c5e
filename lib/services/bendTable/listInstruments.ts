import { instrumentView } from "./instrumentView";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { database } from "@/db/client";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";

export async function listInstruments(): Promise<readonly InstrumentView[]> {
  return (await findInstruments(database())).map(instrumentView);
}
