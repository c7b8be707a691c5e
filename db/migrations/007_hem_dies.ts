import type { Knex } from "knex";

/** The slot of a two-stage hem die: `{ floor, back, opening }` in millimetres, as in a tooling document. */
export async function up(db: Knex): Promise<void> {
  await db.schema.alterTable("tools", (table) => {
    table.jsonb("flattening");
  });
  await db.raw("alter table tools add constraint tools_flattening_of_dies check (flattening is null or kind = 'die')");
}

export async function down(db: Knex): Promise<void> {
  await db.raw("alter table tools drop constraint tools_flattening_of_dies");
  await db.schema.alterTable("tools", (table) => {
    table.dropColumn("flattening");
  });
}
