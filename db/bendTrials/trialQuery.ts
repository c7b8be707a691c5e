import type { Knex } from "knex";
import type { Connection } from "../connection";

/** Trials joined with what they refer to. */
export const trialQuery = (db: Connection): Knex.QueryBuilder =>
  db("bend_trials as trial")
    .join("measuring_instruments as length_instrument", "length_instrument.id", "trial.length_instrument_id")
    .leftJoin("measuring_instruments as thickness_instrument", "thickness_instrument.id", "trial.thickness_instrument_id")
    .join("measuring_instruments as angle_instrument", "angle_instrument.id", "trial.angle_instrument_id")
    .leftJoin("measuring_instruments as radius_instrument", "radius_instrument.id", "trial.radius_instrument_id")
    .leftJoin("users as author", "author.id", "trial.created_by")
    .leftJoin("users as excluder", "excluder.id", "trial.excluded_by")
    .leftJoin("users as withdrawer", "withdrawer.id", "trial.withdrawn_by")
    .leftJoin("parts as part", "part.id", "trial.part_id")
    .leftJoin("sheets as sheet", "sheet.id", "trial.sheet_id");

const instrument = (name: string) =>
  `case when ${name}.id is null then null else json_build_object('id', ${name}.id, 'name', ${name}.name, 'kind', ${name}.kind, 'resolution', ${name}.resolution, 'uncertainty', ${name}.uncertainty) end as ${name}`;

export const trialColumns = (db: Connection): readonly (string | Knex.Raw)[] => [
  "trial.id", "trial.number", "trial.material_id", "trial.batch", "trial.nominal_thickness_mm", "trial.thickness_mm", "trial.v_opening_mm", "trial.punch_radius_mm", "trial.angle_deg",
  "trial.blank_mm", "trial.flange_a_mm", "trial.flange_b_mm", "trial.inside_radius_mm", "trial.measured_by", "trial.note", "trial.created_at",
  "trial.part_id", "part.number as part_number", "trial.sheet_id", "sheet.number as sheet_number",
  "trial.excluded_at", "trial.excluded_reason", "trial.withdrawn_at", "trial.withdrawn_reason",
  "author.name as created_by_name", "excluder.name as excluded_by_name", "withdrawer.name as withdrawn_by_name",
  // T-9999 before T-10000.
  db.raw("lpad(trial.number, 20, '0') as number_order"),
  db.raw("to_char(trial.measured_on, 'YYYY-MM-DD') as measured_on"),
  ...["length_instrument", "thickness_instrument", "angle_instrument", "radius_instrument"].map((name) => db.raw(instrument(name))),
];
