import pg from "pg";
import { expect, inject, it } from "vitest";
import { freshDatabase } from "./freshDatabase";

const ask = async (url: string, statement: string) => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<{ n: number }>(statement)).rows[0]?.n;
  } finally {
    await client.end();
  }
};

it("gives every test file a migrated database of its own", async () => {
  const database = await freshDatabase();
  expect(await ask(database.url, "select count(*)::int as n from tools")).toBe(0);
  await ask(database.url, "create table only_here (n int)");
  expect(await ask(inject("databaseUrl"), "select count(*)::int as n from pg_tables where tablename = 'only_here'")).toBe(0);
  await database.drop();
  await expect(ask(database.url, "select 1 as n")).rejects.toThrow(/does not exist/);
});
