import type { Knex } from "knex";

/**
 * The shop: materials, machines, tools with their pieces, parts with revisions, plans, sheets.
 * Lengths are in millimetres, angles in degrees turned through or included as trade has it, forces in kN.
 */
export async function up(db: Knex): Promise<void> {
  await db.raw(stock);
  await db.raw(parts);
  await db.raw(plans);
  await db.raw(sheets);
}

export async function down(db: Knex): Promise<void> {
  await db.raw(`
    drop table sheets;
    drop function sheet_is_frozen();
    drop table plans;
    alter table parts drop constraint parts_latest_revision_exists;
    drop table part_revisions;
    drop table parts;
    drop table tool_pieces;
    drop table tools;
    drop table machines;
    drop table materials;
    drop sequence sheet_number;
    drop sequence part_number;
  `);
}

const stock = `
  create table materials (
    id text primary key check (length(id) between 1 and 60),
    name text not null,
    material_group text not null check (material_group in ('steel', 'stainless', 'aluminium', 'copper', 'brass')),
    standard text not null,
    facts jsonb not null,
    created_at timestamptz not null default now()
  );

  create table machines (
    id uuid primary key default gen_random_uuid(),
    name text not null unique check (length(name) between 1 and 120),
    bed_length_mm double precision not null check (bed_length_mm > 0),
    max_force_kn double precision not null check (max_force_kn > 0),
    daylight_mm double precision not null check (daylight_mm > 0),
    punch_tang text not null,
    die_tang text not null,
    document jsonb not null,
    created_at timestamptz not null default now()
  );

  create table tools (
    id uuid primary key default gen_random_uuid(),
    code text not null unique check (length(code) between 1 and 60),
    kind text not null check (kind in ('punch', 'die')),
    name text not null check (length(name) between 1 and 120),
    profile jsonb not null check (jsonb_typeof(profile) = 'array' and jsonb_array_length(profile) >= 3),
    angle_deg double precision not null check (angle_deg > 0 and angle_deg <= 180),
    tip_radius_mm double precision check (tip_radius_mm >= 0),
    v_opening_mm double precision check (v_opening_mm > 0),
    shoulder_radius_mm double precision check (shoulder_radius_mm >= 0),
    height_mm double precision not null check (height_mm > 0),
    max_force_kn_per_m double precision not null check (max_force_kn_per_m > 0),
    tang text not null,
    created_at timestamptz not null default now(),
    updated_at timestamptz not null default now(),
    constraint tools_kind_has_its_values check (
      case kind
        when 'punch' then tip_radius_mm is not null and v_opening_mm is null and shoulder_radius_mm is null
        else tip_radius_mm is null and v_opening_mm is not null and shoulder_radius_mm is not null
      end
    )
  );
  create index tools_by_fit on tools (kind, v_opening_mm, angle_deg);

  create table tool_pieces (
    id uuid primary key default gen_random_uuid(),
    tool_id uuid not null references tools (id),
    code text not null unique check (length(code) between 1 and 80),
    length_mm double precision not null check (length_mm > 0),
    horn text check (horn in ('left', 'right', 'both')),
    rack text not null default '' check (length(rack) <= 60),
    state text not null default 'in rack' check (state in ('in rack', 'at brake', 'at regrind', 'withdrawn')),
    machine_id uuid references machines (id),
    updated_at timestamptz not null default now(),
    constraint tool_pieces_at_a_brake check ((state = 'at brake') = (machine_id is not null))
  );
  create index tool_pieces_of_tool on tool_pieces (tool_id, state, length_mm desc);
  create index tool_pieces_at_machine on tool_pieces (machine_id) where machine_id is not null;
`;

const parts = `
  create sequence part_number start 1001;
  create table parts (
    id uuid primary key default gen_random_uuid(),
    number text not null unique check (length(number) between 1 and 60),
    latest_revision integer not null check (latest_revision > 0),
    created_at timestamptz not null default now(),
    updated_at timestamptz not null default now(),
    created_by uuid references users (id)
  );
  create index parts_by_time on parts (updated_at desc);

  create table part_revisions (
    id uuid primary key default gen_random_uuid(),
    part_id uuid not null references parts (id),
    revision integer not null check (revision > 0),
    name text not null check (length(name) between 1 and 200),
    material_id text not null references materials (id),
    thickness_mm double precision not null check (thickness_mm > 0),
    flat_width_mm double precision not null check (flat_width_mm > 0),
    flat_depth_mm double precision not null check (flat_depth_mm > 0),
    bends integer not null check (bends >= 0),
    document jsonb not null check (document ->> 'format' = 'part/1'),
    note text not null default '' check (length(note) <= 2000),
    created_at timestamptz not null default now(),
    created_by uuid references users (id),
    unique (part_id, revision),
    unique (id, part_id)
  );
  create index part_revisions_by_material on part_revisions (material_id, thickness_mm);
  create index part_revisions_by_name on part_revisions (lower(name));

  alter table parts add constraint parts_latest_revision_exists
    foreign key (id, latest_revision) references part_revisions (part_id, revision) deferrable initially deferred;
`;

const plans = `
  create table plans (
    id uuid primary key default gen_random_uuid(),
    part_id uuid not null,
    revision_id uuid not null,
    machine_id uuid not null references machines (id),
    batch integer not null check (batch > 0),
    status text not null check (status in ('optimal', 'feasible', 'infeasible', 'unknown')),
    steps integer not null check (steps >= 0),
    stations integer not null check (stations >= 0),
    seconds_per_part double precision not null,
    setup_seconds double precision not null,
    document jsonb not null check (document ->> 'format' = 'plan/1'),
    material jsonb not null,
    machine_document jsonb not null,
    tools jsonb not null check (jsonb_typeof(tools) = 'array'),
    inputs_digest text not null check (length(inputs_digest) = 64),
    engine text not null,
    created_at timestamptz not null default now(),
    created_by uuid references users (id),
    foreign key (revision_id, part_id) references part_revisions (id, part_id),
    unique (id, part_id, machine_id)
  );
  create unique index plans_same_inputs on plans (revision_id, inputs_digest) where status <> 'unknown';
  create index plans_of_part on plans (part_id, created_at desc);
  create index plans_by_time on plans (created_at desc);
  create index plans_of_machine on plans (machine_id);
`;

const sheets = `
  create sequence sheet_number start 1001;
  create table sheets (
    id uuid primary key default gen_random_uuid(),
    number text not null unique default 'S-' || nextval('sheet_number'),
    plan_id uuid not null,
    part_id uuid not null,
    machine_id uuid not null,
    state text not null default 'draft' check (state in ('draft', 'released', 'superseded')),
    snapshot jsonb,
    created_at timestamptz not null default now(),
    created_by uuid references users (id),
    released_at timestamptz,
    released_by uuid references users (id),
    superseded_at timestamptz,
    foreign key (plan_id, part_id, machine_id) references plans (id, part_id, machine_id),
    constraint sheets_frozen_at_release check ((state = 'draft') = (snapshot is null)),
    constraint sheets_release_time check ((state = 'draft') = (released_at is null)),
    constraint sheets_superseded_time check ((state = 'superseded') = (superseded_at is not null))
  );
  create unique index sheets_one_released on sheets (part_id, machine_id) where state = 'released';
  create unique index sheets_one_draft on sheets (plan_id) where state = 'draft';
  create index sheets_of_plan on sheets (plan_id);
  create index sheets_by_time on sheets (created_at desc);

  create function sheet_is_frozen() returns trigger language plpgsql as $$
  begin
    if tg_op = 'DELETE' then
      raise exception 'sheet % was released and stays on record', old.number using errcode = 'restrict_violation';
    end if;
    if new.state = 'draft' or new.snapshot is distinct from old.snapshot or new.number <> old.number
      or new.plan_id <> old.plan_id or (old.state = 'superseded' and new.state <> 'superseded') then
      raise exception 'sheet % was released and does not change', old.number using errcode = 'restrict_violation';
    end if;
    return new;
  end $$;
  create trigger sheets_stay_frozen before update or delete on sheets
    for each row when (old.state <> 'draft') execute function sheet_is_frozen();
`;
