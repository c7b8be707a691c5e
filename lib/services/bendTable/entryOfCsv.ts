import type { TrialCsvRow } from "./csvRowOf";
import type { InstrumentRow } from "@/db/bendTrials/instrumentRow";
import type { TrialLineInput } from "@/lib/schemas/bendTableInputs";

/** A line of a file as a line of the notebook in millimetres; an instrument that no one has keeps its name, which is then no id of any. */
export function entryOfCsv(row: TrialCsvRow, instruments: ReadonlyMap<string, InstrumentRow>, id = ""): TrialLineInput {
  const idOf = (name: string): string => [...instruments.values()].find((one) => one.name.toLowerCase() === name.trim().toLowerCase())?.id ?? name;
  return {
    id,
    material: row.material,
    batch: row.batch ?? "",
    nominal: row.nominal,
    thickness: row.thickness,
    vOpening: row.vOpening,
    punchRadius: row.punchRadius,
    angle: row.angle,
    blank: row.blank,
    flangeA: row.flangeA,
    flangeB: row.flangeB,
    insideRadius: row.insideRadius,
    lengthInstrument: idOf(row.lengthInstrument),
    thicknessInstrument: row.thicknessInstrument === null ? null : idOf(row.thicknessInstrument),
    angleInstrument: idOf(row.angleInstrument),
    radiusInstrument: row.insideRadius === null || row.radiusInstrument === null ? null : idOf(row.radiusInstrument),
    measuredOn: row.measuredOn,
    measuredBy: row.measuredBy,
    note: row.note ?? "",
    partId: null,
    sheetId: null,
  };
}
