import { randomBytes } from "node:crypto";
import pg from "pg";
import { inject } from "vitest";
import { EMPTY_TEMPLATE, SHOP_TEMPLATE } from "./templates";

/**
 * A database of this test file's own on the run's PostgreSQL: migrated, and empty or with the demonstration
 * shop in it. Call `drop` when done (every connection to it is cut).
 */
export async function freshDatabase(contents: "empty" | "shop" = "empty"): Promise<{ url: string; drop: () => Promise<void> }> {
  const name = `test_${randomBytes(6).toString("hex")}`;
  await administer(`create database ${name} template ${contents === "shop" ? SHOP_TEMPLATE : EMPTY_TEMPLATE}`);
  const url = new URL(inject("databaseUrl"));
  url.pathname = `/${name}`;
  return { url: url.href, drop: () => administer(`drop database ${name} with (force)`) };
}

async function administer(statement: string) {
  const url = new URL(inject("databaseUrl"));
  url.pathname = "/postgres";
  const client = new pg.Client({ connectionString: url.href });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
