import type { MaterialFacts } from "@/bending/handbook/material";
import { evaluateTrial } from "@/bending/shopTable/evaluateTrial";
import { bendTrialFromRow } from "@/db/bendTrials/bendTrialFromRow";
import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { Judged, TrialView } from "@/lib/schemas/bendTableViews";
import { trialKey } from "./trialKey";

/** A trial as the API answers it, with what comes of it. */
export function trialView(row: TrialRow, material: MaterialFacts | undefined): TrialView {
  const trial = bendTrialFromRow(row);
  const found = material === undefined ? null : evaluateTrial(trial, material);
  const excluded = judged(row.excluded_reason, row.excluded_by_name, row.excluded_at);
  const withdrawn = judged(row.withdrawn_reason, row.withdrawn_by_name, row.withdrawn_at);
  const instruments = [row.length_instrument, row.thickness_instrument, row.angle_instrument, row.radius_instrument];
  return {
    id: row.id,
    number: row.number,
    state: withdrawn !== null ? "withdrawn" : excluded !== null ? "excluded" : "counted",
    material: row.material_id,
    batch: row.batch,
    nominalMm: row.nominal_thickness_mm,
    thicknessMm: row.thickness_mm,
    vOpeningMm: row.v_opening_mm,
    punchRadiusMm: row.punch_radius_mm,
    angleDeg: row.angle_deg,
    blankMm: row.blank_mm,
    flangesMm: [row.flange_a_mm, row.flange_b_mm],
    insideRadiusMm: row.inside_radius_mm,
    measuredWith: [...new Set(instruments.flatMap((instrument) => (instrument === null ? [] : [instrument.name])))],
    measuredOn: row.measured_on,
    measuredBy: row.measured_by,
    note: row.note,
    part: row.part_id === null ? null : { id: row.part_id, number: row.part_number ?? "" },
    sheet: row.sheet_id === null ? null : { id: row.sheet_id, number: row.sheet_number ?? "" },
    enteredAt: row.created_at.toISOString(),
    enteredBy: row.created_by_name ?? "",
    excluded,
    withdrawn,
    result: found?.ok ? found.value : null,
    problem: found === null ? `${row.material_id} is no material of the shop` : found.ok ? null : found.error.map(({ path, message }) => `${path} ${message}`).join("; "),
    valueKey: found?.ok && withdrawn === null && material !== undefined ? trialKey(trial, material) : null,
  };
}

const judged = (reason: string | null, by: string | null, at: Date | null): Judged | null =>
  (reason === null || at === null ? null : { reason, by: by ?? "", at: at.toISOString() });
