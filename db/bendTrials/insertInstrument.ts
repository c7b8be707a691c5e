import type { Connection } from "../connection";
import type { InstrumentKind } from "./instrumentRow";

export interface NewInstrument {
  readonly name: string;
  readonly kind: InstrumentKind;
  /** In millimetres, of a protractor in degrees; so is the uncertainty. */
  readonly resolution: number;
  readonly uncertainty: number;
  readonly note: string;
}

export async function insertInstrument(db: Connection, instrument: NewInstrument, by: string | null): Promise<string> {
  const [row] = await db("measuring_instruments").insert({ ...instrument, created_by: by }).returning<{ id: string }[]>("id");
  return row!.id;
}
