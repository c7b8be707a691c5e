import type { Knex } from "knex";
import { env } from "@/lib/env";
import { connect } from "./connect";

const store = globalThis as typeof globalThis & { foldwrightDatabase?: Knex };

/** The process's own pool: one, whatever is reloaded around it. */
export function database(): Knex {
  store.foldwrightDatabase ??= connect(env.databaseUrl);
  return store.foldwrightDatabase;
}
