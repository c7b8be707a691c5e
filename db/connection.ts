import type { Knex } from "knex";

/** What a repository works on: the pool, or a transaction of it. */
export type Connection = Knex;
