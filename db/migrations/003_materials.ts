import type { Knex } from "knex";

/**
 * Materials by version: each change of a material's values is a new version that stays as it is; plans name the version
 * that they were made with. Beside them the shop's own settings, one row a subject.
 */
export async function up(db: Knex): Promise<void> {
  await db.raw(`
    create table material_versions (
      id uuid primary key default gen_random_uuid(),
      material_id text not null references materials (id),
      version integer not null check (version > 0),
      facts jsonb not null,
      note text not null default '' check (length(note) <= 2000),
      created_at timestamptz not null default now(),
      created_by uuid references users (id),
      unique (material_id, version),
      constraint material_versions_of_their_material check (facts ->> 'id' = material_id)
    );

    insert into material_versions (material_id, version, facts, note, created_at)
      select id, 1, facts, 'as on record before versions were kept', created_at from materials;

    alter table materials
      add column version integer not null default 1 check (version > 0),
      add column withdrawn_at timestamptz,
      add column withdrawn_by uuid references users (id),
      add constraint materials_version_exists foreign key (id, version)
        references material_versions (material_id, version) deferrable initially deferred;

    create function material_version_is_a_record() returns trigger language plpgsql as $$
    begin
      raise exception 'version % of material % stays on record', old.version, old.material_id using errcode = 'restrict_violation';
    end $$;
    create trigger material_versions_stay before update or delete on material_versions
      for each row execute function material_version_is_a_record();

    alter table plans add column material_version_id uuid references material_versions (id);
    update plans set material_version_id = made.id from material_versions made where made.facts = plans.material;
    create index plans_of_material_version on plans (material_version_id);

    create table shop_settings (
      subject text primary key check (length(subject) between 1 and 60),
      value jsonb not null,
      version integer not null default 1 check (version > 0),
      updated_at timestamptz not null default now(),
      updated_by uuid references users (id)
    );
  `);
}

export async function down(db: Knex): Promise<void> {
  await db.raw(`
    drop table shop_settings;
    alter table plans drop column material_version_id;
    alter table materials drop column version, drop column withdrawn_at, drop column withdrawn_by;
    drop table material_versions;
    drop function material_version_is_a_record();
  `);
}
