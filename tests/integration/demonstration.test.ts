import { compare } from "bcryptjs";
import type { Knex } from "knex";
import { afterAll, beforeAll, expect, it } from "vitest";
import { connect } from "@/db/connect";
import { seedDemonstration } from "@/seeds/demonstration";
import { demonstrationPassword } from "@/seeds/shop/demonstrationPassword";
import { bendTrials, excludedTrial } from "@/seeds/shop/bendTrials";
import { people } from "@/seeds/shop/people";
import { tooling } from "@/seeds/shop/tools";
import { pieceStates } from "@/seeds/shop/tools/pieceStates";
import { freshDatabase } from "./freshDatabase";

let knex: Knex;
let drop: () => Promise<void>;

beforeAll(async () => {
  const database = await freshDatabase("shop");
  knex = connect(database.url);
  drop = database.drop;
});
afterAll(async () => {
  await knex.destroy();
  await drop();
});

const countOf = async (table: string) => Number((await knex(table).count<{ count: string }[]>({ count: "*" }))[0]?.count);

it("holds the whole shop", async () => {
  expect(await countOf("users")).toBe(people.length);
  expect(await countOf("machines")).toBe(2);
  expect(await countOf("tools")).toBe(62);
  expect(await countOf("tool_pieces")).toBe(tooling.tools.flatMap((tool) => tool.sections).length);
  expect(await countOf("parts")).toBe(8);
  expect(await countOf("bend_trials")).toBe(bendTrials.length);
  expect(await knex("bend_trials").whereNotNull("excluded_at").pluck("number")).toEqual([`T-${1001 + excludedTrial.index}`]);
  expect(await knex("part_revisions").whereNull("created_by")).toEqual([]);
});

it("has the pieces that are away in their states, at their brakes", async () => {
  const rows = await knex("tool_pieces").whereNot({ state: "in rack" }).select<{ code: string; state: string; machine_id: string | null }[]>("code", "state", "machine_id");
  expect(Object.fromEntries(rows.map((row) => [row.code, row.state]))).toEqual(Object.fromEntries(Object.entries(pieceStates).map(([mark, { state }]) => [mark, state])));
  expect(new Set(rows.flatMap((row) => row.machine_id ?? [])).size).toBe(2);
});

it("lets the people in with the password that is printed, each under a hash of his own", async () => {
  const rows = await knex("users").select<{ password_hash: string }[]>("password_hash");
  expect(new Set(rows.map((row) => row.password_hash)).size).toBe(people.length);
  expect(await compare(demonstrationPassword, rows[0]?.password_hash ?? "")).toBe(true);
});

it("is put in once, and never beside people who are there", async () => {
  expect(await seedDemonstration(knex)).toBe(false);
  expect(await countOf("users")).toBe(people.length);
});
