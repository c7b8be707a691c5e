import { materialLookup } from "../materialLookup";
import type { EntryContext } from "./entryProblems";
import type { LengthUnit } from "@/bending/core/units";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { findKnownIds } from "@/db/bendTrials/findKnownIds";
import type { Connection } from "@/db/connection";
import type { TrialLineInput } from "@/lib/schemas/bendTableInputs";

/** What lines of the notebook are checked against, as it stands now. */
export async function entryContext(db: Connection, units: LengthUnit, lines: readonly TrialLineInput[] = []): Promise<EntryContext> {
  return {
    units,
    materials: await materialLookup(db),
    instruments: new Map((await findInstruments(db)).filter((row) => row.withdrawn_at === null).map((row) => [row.id, row])),
    parts: await findKnownIds(db, "parts", lines.flatMap(({ partId }) => partId ?? [])),
    sheets: await findKnownIds(db, "sheets", lines.flatMap(({ sheetId }) => sheetId ?? [])),
    lastDay: tomorrow(),
  };
}

/** Wherever the shop is, its today is not after this day. */
const tomorrow = (): string => new Date(Date.now() + 86_400_000).toISOString().slice(0, 10);
