import type { Knex } from "knex";

/**
 * The shop's bend table: what was measured on trial bends, and with what. Lengths in millimetres, angles in degrees
 * (a bend's angle is the one turned through). A trial is a record: its measurements never change and it is never
 * deleted, only left out of the values (excluded) or taken back (withdrawn), each with who, when and why.
 */
export async function up(db: Knex): Promise<void> {
  await db.raw(instruments);
  await db.raw(trials);
  await db.raw(record);
}

export async function down(db: Knex): Promise<void> {
  await db.raw(`
    drop table bend_trials;
    drop function bend_trial_is_a_record();
    drop sequence bend_trial_number;
    drop table measuring_instruments;
  `);
}

/** The first instruments are those that most shops own; their limits of error are common practice, no source. */
const instruments = `
  create table measuring_instruments (
    id uuid primary key default gen_random_uuid(),
    name text not null check (length(trim(name)) between 1 and 80),
    kind text not null,
    resolution double precision not null,
    uncertainty double precision not null,
    note text not null default '' check (length(note) <= 500),
    created_at timestamptz not null default now(),
    created_by uuid references users (id),
    withdrawn_at timestamptz,
    withdrawn_by uuid references users (id),
    withdrawn_reason text,
    constraint instruments_kind_known check (kind in ('calliper', 'micrometer', 'height gauge', 'protractor', 'radius gauge')),
    constraint instruments_resolution_from_zero check (resolution >= 0 and resolution <= 10),
    constraint instruments_uncertainty_over_zero check (uncertainty > 0 and uncertainty <= 10),
    constraint instruments_withdrawn_with_reason check ((withdrawn_at is null) = (withdrawn_reason is null) and length(trim(coalesce(withdrawn_reason, 'x'))) between 1 and 500)
  );
  create unique index instruments_name_taken on measuring_instruments (lower(name)) where withdrawn_at is null;

  insert into measuring_instruments (name, kind, resolution, uncertainty, note) values
    ('Calliper 0.01', 'calliper', 0.01, 0.03, 'common practice, no source'),
    ('Micrometer 0.01', 'micrometer', 0.01, 0.005, 'common practice, no source'),
    ('Height gauge 0.01', 'height gauge', 0.01, 0.03, 'common practice, no source'),
    ('Protractor 5 minutes', 'protractor', 0.0833333333, 0.0833333333, 'common practice, no source'),
    ('Radius gauges', 'radius gauge', 0.25, 0.125, 'common practice, no source');
`;

const trials = `
  create sequence bend_trial_number start 1001;
  create table bend_trials (
    id uuid primary key default gen_random_uuid(),
    number text not null unique default 'T-' || nextval('bend_trial_number'),
    material_id text not null references materials (id),
    batch text not null default '' check (length(batch) <= 60),
    nominal_thickness_mm double precision not null,
    thickness_mm double precision not null,
    v_opening_mm double precision not null,
    punch_radius_mm double precision not null,
    angle_deg double precision not null,
    blank_mm double precision not null,
    flange_a_mm double precision not null,
    flange_b_mm double precision not null,
    inside_radius_mm double precision,
    length_instrument_id uuid not null references measuring_instruments (id),
    thickness_instrument_id uuid references measuring_instruments (id),
    angle_instrument_id uuid not null references measuring_instruments (id),
    radius_instrument_id uuid references measuring_instruments (id),
    measured_on date not null,
    measured_by text not null check (length(trim(measured_by)) between 1 and 120),
    note text not null default '' check (length(note) <= 500),
    part_id uuid references parts (id) on delete set null,
    sheet_id uuid references sheets (id) on delete set null,
    created_at timestamptz not null default now(),
    created_by uuid references users (id),
    excluded_at timestamptz,
    excluded_by uuid references users (id),
    excluded_reason text,
    withdrawn_at timestamptz,
    withdrawn_by uuid references users (id),
    withdrawn_reason text,
    constraint bend_trials_lengths check (
      nominal_thickness_mm > 0 and nominal_thickness_mm <= 50 and thickness_mm > 0 and thickness_mm <= 50 and v_opening_mm > 0 and v_opening_mm <= 500 and punch_radius_mm >= 0 and punch_radius_mm <= 200
      and blank_mm > 0 and blank_mm <= 20000 and flange_a_mm > 0 and flange_a_mm <= 20000 and flange_b_mm > 0 and flange_b_mm <= 20000
      and (inside_radius_mm is null or inside_radius_mm >= 0 and inside_radius_mm <= 500)
    ),
    constraint bend_trials_angle check (angle_deg > 0 and angle_deg < 180),
    constraint bend_trials_radius_has_instrument check ((inside_radius_mm is null) = (radius_instrument_id is null)),
    constraint bend_trials_excluded_with_reason check ((excluded_at is null) = (excluded_reason is null) and length(trim(coalesce(excluded_reason, 'x'))) between 1 and 500),
    constraint bend_trials_withdrawn_with_reason check ((withdrawn_at is null) = (withdrawn_reason is null) and length(trim(coalesce(withdrawn_reason, 'x'))) between 1 and 500)
  );
  create index bend_trials_by_cell on bend_trials (material_id, nominal_thickness_mm, v_opening_mm) where withdrawn_at is null;
  create index bend_trials_by_time on bend_trials (created_at desc);
`;

const record = `
  create function bend_trial_is_a_record() returns trigger language plpgsql as $$
  begin
    if tg_op = 'DELETE' then
      raise exception 'bend trial % stays on record', old.number using errcode = 'restrict_violation';
    end if;
    if (new.number, new.material_id, new.batch, new.nominal_thickness_mm, new.thickness_mm, new.v_opening_mm, new.punch_radius_mm, new.angle_deg, new.blank_mm, new.flange_a_mm,
        new.flange_b_mm, new.inside_radius_mm, new.length_instrument_id, new.thickness_instrument_id, new.angle_instrument_id, new.radius_instrument_id, new.measured_on, new.measured_by, new.created_at)
      is distinct from
       (old.number, old.material_id, old.batch, old.nominal_thickness_mm, old.thickness_mm, old.v_opening_mm, old.punch_radius_mm, old.angle_deg, old.blank_mm, old.flange_a_mm,
        old.flange_b_mm, old.inside_radius_mm, old.length_instrument_id, old.thickness_instrument_id, old.angle_instrument_id, old.radius_instrument_id, old.measured_on, old.measured_by, old.created_at) then
      raise exception 'what was measured in bend trial % does not change', old.number using errcode = 'restrict_violation';
    end if;
    if old.withdrawn_at is not null and new.withdrawn_at is null then
      raise exception 'bend trial % was withdrawn and stays so', old.number using errcode = 'restrict_violation';
    end if;
    return new;
  end $$;
  create trigger bend_trials_stay before update or delete on bend_trials for each row execute function bend_trial_is_a_record();
`;
