import type { Connection } from "../connection";
import type { InstrumentRow } from "./instrumentRow";

/** Every instrument, those in use first, by kind and name. */
export async function findInstruments(db: Connection): Promise<readonly InstrumentRow[]> {
  const trials = db("bend_trials as trial").whereNull("trial.withdrawn_at")
    .whereRaw("instrument.id in (trial.length_instrument_id, trial.thickness_instrument_id, trial.angle_instrument_id, trial.radius_instrument_id)").count("*");
  return db("measuring_instruments as instrument")
    .leftJoin("users as author", "author.id", "instrument.created_by")
    .leftJoin("users as withdrawer", "withdrawer.id", "instrument.withdrawn_by")
    .select<InstrumentRow[]>("instrument.id", "instrument.name", "instrument.kind", "instrument.resolution", "instrument.uncertainty", "instrument.note",
      "instrument.created_at", "instrument.withdrawn_at", "instrument.withdrawn_reason", "author.name as created_by_name", "withdrawer.name as withdrawn_by_name",
      db.raw("(?)::int as trials", [trials]))
    .orderByRaw("instrument.withdrawn_at is not null, instrument.kind, lower(instrument.name)");
}
