import type { Knex } from "knex";

/**
 * Where a plan comes from and what ended its search, so that the same inputs are planned once and a plan that was cut
 * short is never taken for the last word; and the record of looking a stored plan over again.
 *
 * `ended`: `itself` (searching on would change nothing), `limit` (the time was up) or `person` (stopped by hand, the best
 * so far kept). `asked`: what else was asked for (how many other plans, whose pieces, a person's own order), to search on with.
 */
export async function up(db: Knex): Promise<void> {
  await db.raw(`
    alter table plans
      add column origin text not null default 'planned',
      add column from_plan_id uuid references plans (id) on delete set null,
      add column ended text not null default 'itself',
      add column limit_ms integer not null default 60000,
      add column asked jsonb not null default '{}',
      add constraint plans_origin_known check (origin in ('planned', 'own order', 'chosen')),
      add constraint plans_ended_known check (ended in ('itself', 'limit', 'person')),
      add constraint plans_limit_over_zero check (limit_ms > 0);
    update plans set ended = 'limit' where status in ('feasible', 'unknown');
    drop index plans_same_inputs;
    create unique index plans_same_inputs on plans (revision_id, inputs_digest) where ended = 'itself';
    create index plans_by_inputs on plans (revision_id, inputs_digest);

    create table plan_checks (
      id uuid primary key default gen_random_uuid(),
      plan_id uuid not null references plans (id) on delete cascade,
      engine text not null,
      holds boolean not null,
      document jsonb not null,
      checked_at timestamptz not null default now(),
      checked_by uuid references users (id)
    );
    create index plan_checks_of_plan on plan_checks (plan_id, checked_at desc);
  `);
}

/** Of plans that only the new index lets stand beside each other, the newest stays the one that is found. */
export async function down(db: Knex): Promise<void> {
  await db.raw(`
    drop table plan_checks;
    drop index plans_by_inputs;
    drop index plans_same_inputs;
    update plans set inputs_digest = encode(sha256((inputs_digest || id::text)::bytea), 'hex')
      where status <> 'unknown' and exists (
        select 1 from plans other
        where other.revision_id = plans.revision_id and other.inputs_digest = plans.inputs_digest and other.status <> 'unknown'
          and (other.created_at, other.id) > (plans.created_at, plans.id));
    create unique index plans_same_inputs on plans (revision_id, inputs_digest) where status <> 'unknown';
    alter table plans drop column origin, drop column from_plan_id, drop column ended, drop column limit_ms, drop column asked;
  `);
}
