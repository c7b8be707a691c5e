import { createHash } from "node:crypto";
import type { Knex } from "knex";
import { invariant } from "@/bending/core/invariant";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { insertTrials } from "@/db/bendTrials/insertTrials";
import { judgeTrial } from "@/db/bendTrials/judgeTrial";
import { bendTrials, excludedTrial } from "./shop/bendTrials";

/** Puts in the shop's trials, entered by the toolroom, with one that the engineer left out. */
export async function seedBendTrials(db: Knex, by: { readonly toolroom: string; readonly engineer: string }): Promise<void> {
  const instruments = await findInstruments(db);
  const instrument = (kind: string): string => {
    const found = instruments.find((one) => one.kind === kind);
    invariant(found !== undefined, `a new shop has a ${kind}`);
    return found.id;
  };
  await insertTrials(db, bendTrials.map((trial, index) => ({
    id: idOf(index),
    material: trial.material,
    batch: trial.batch,
    nominalThicknessMm: trial.nominal,
    thicknessMm: trial.thickness,
    vOpeningMm: trial.vOpening,
    punchRadiusMm: trial.punchRadius,
    angleDeg: trial.angle,
    blankMm: trial.blank,
    flangeAMm: trial.flanges[0],
    flangeBMm: trial.flanges[1],
    insideRadiusMm: trial.insideRadius,
    lengthInstrumentId: instrument("calliper"),
    thicknessInstrumentId: instrument("micrometer"),
    angleInstrumentId: instrument("protractor"),
    radiusInstrumentId: trial.insideRadius === null ? null : instrument("radius gauge"),
    measuredOn: trial.measuredOn,
    measuredBy: trial.measuredBy,
    note: trial.note,
  })), by.toolroom);
  await judgeTrial(db, idOf(excludedTrial.index), { state: "excluded", reason: excludedTrial.reason }, by.engineer);
}

/** The same id each time: a UUID of version 4 in form, made of the trial's place. */
function idOf(index: number): string {
  const hex = createHash("sha256").update(`demonstration trial ${index}`).digest("hex");
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}
