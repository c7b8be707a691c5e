import { afterAll, beforeAll } from "vitest";
import type { Knex } from "knex";
import { connect } from "@/db/connect";
import { freshDatabase } from "./freshDatabase";

/** A database of this test file's own, opened before its tests and dropped after them. */
export function openDatabase(): () => Knex {
  let db: Knex;
  let drop: () => Promise<void>;
  beforeAll(async () => {
    const fresh = await freshDatabase();
    db = connect(fresh.url);
    drop = fresh.drop;
  });
  afterAll(async () => {
    await db.destroy();
    await drop();
  });
  return () => db;
}
