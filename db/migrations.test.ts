import { expect, it } from "vitest";
import { openDatabase } from "@/tests/integration/openDatabase";
import { migrateDown } from "./migrateDown";
import { migrateLatest } from "./migrateLatest";
import { migrationList } from "./migrationList";

const database = openDatabase();

const everything = async () => {
  const { rows } = await database().raw<{ rows: { kind: string; name: string }[] }>(`
    select 'relation' as kind, relname::text as name from pg_class where relnamespace = 'public'::regnamespace
    union all select 'function', proname::text from pg_proc where pronamespace = 'public'::regnamespace
    union all select 'constraint', conname::text from pg_constraint where connamespace = 'public'::regnamespace
    order by 1, 2`);
  return rows.filter(({ name }) => !name.startsWith("knex_")).map(({ kind, name }) => `${kind} ${name}`);
};

it("goes down to nothing and up again to the same", async () => {
  const before = await everything();
  expect(before).toEqual(expect.arrayContaining(["relation tools", "relation sheets_one_released", "function sheet_is_frozen"]));
  await migrateDown(database());
  expect(await everything()).toEqual([]);
  expect(await migrateLatest(database())).toEqual(migrationList.map(({ name }) => name));
  expect(await everything()).toEqual(before);
  expect(await migrateLatest(database())).toEqual([]);
});
