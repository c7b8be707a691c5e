import { beforeAll, expect, it } from "vitest";
import { builtInMaterials } from "@/bending/handbook/materials";
import { bracketMachine } from "@/tests/integration/shop/bracketMachine";
import { bracketPlan } from "@/tests/integration/shop/bracketPlan";
import { bracketRevision } from "@/tests/integration/shop/bracketRevision";
import { bracketShop } from "@/tests/integration/shop/bracketShop";
import { bracketDie, bracketPunch } from "@/tests/integration/shop/bracketTools";
import { openDatabase } from "@/tests/integration/openDatabase";
import { deletePart } from "../parts/deletePart";
import { insertPart } from "../parts/insertPart";
import { findPlan } from "../plans/findPlan";
import type { PlanEnd } from "@/bending/plan/planEnd";
import { findSamePlan } from "../plans/findSamePlan";
import { insertPlan } from "../plans/insertPlan";
import { findSheet } from "./findSheet";
import { findSheets } from "./findSheets";
import { insertSheet } from "./insertSheet";
import { releaseSheet } from "./releaseSheet";

const database = openDatabase();
let machineId: string;
let partId: string;
let revisionId: string;
const every = ["draft", "released", "superseded"] as const;
const digest = (letter: string) => letter.repeat(64);

beforeAll(async () => {
  machineId = await bracketShop(database());
  ({ partId, revisionId } = await insertPart(database(), "B-1", bracketRevision()));
});

const plan = (inputsDigest: string, changes = {}, ended: PlanEnd = "itself", limitMs = 60_000) => insertPlan(database(), {
  partId, revisionId, machineId, plan: { ...bracketPlan, ...changes }, material: builtInMaterials[0]!, materialVersionId: null, machineDocument: bracketMachine,
  tools: [bracketPunch, bracketDie], inputsDigest, by: null, origin: "planned", fromPlanId: null, ended, limitMs, asked: {},
});
const draft = async (letter: string) => insertSheet(database(), { planId: (await plan(digest(letter))).id, partId, machineId, by: null });
const state = async (id: string) => (await findSheet(database(), every, id))?.state;

it("stores a plan once for the same inputs; one that was cut short is found for no longer a search, stopped by hand for none", async () => {
  const first = await plan(digest("a"));
  expect([first.inserted, await plan(digest("a"))]).toEqual([true, { id: first.id, inserted: false }]);
  expect((await findPlan(database(), first.id))).toMatchObject({ plan: bracketPlan, tools: [bracketPunch, bracketDie], machine_document: bracketMachine, part_number: "B-1", ended: "itself", origin: "planned" });
  const found = (letter: string, limitMs: number) => findSamePlan(database(), revisionId, digest(letter), limitMs);
  expect(await found("a", 600_000)).toBe(first.id);
  const timed = await plan(digest("b"), { status: "feasible" }, "limit", 10_000);
  expect([await found("b", 10_000), await found("b", 10_001)]).toEqual([timed.id, undefined]);
  const longer = await plan(digest("b"), { status: "feasible" }, "limit", 20_000);
  expect([await found("b", 5_000), await found("b", 20_000)]).toEqual([longer.id, longer.id]);
  const proven = await plan(digest("b"));
  expect([proven.inserted, await found("b", 600_000)]).toEqual([true, proven.id]);
  for (const [letter, status, ended] of [["c", "unknown", "limit"], ["d", "feasible", "person"]] as const) {
    const { id } = await plan(digest(letter), { status }, ended);
    const again = await plan(digest(letter), { status }, ended);
    expect([again.inserted, again.id === id, await found(letter, 1_000)]).toEqual([true, false, undefined]);
  }
});

it("makes one draft of a plan", async () => {
  const first = await draft("b");
  expect(await draft("b")).toEqual({ ...first, inserted: false });
});

it("has one released sheet of a part on a machine, also when two are released at once", async () => {
  const sheets = [await draft("c"), await draft("d"), await draft("e")];
  await Promise.all(sheets.map(({ id }) => releaseSheet(database(), { id, snapshot: { says: id }, by: null })));
  const states = await Promise.all(sheets.map(({ id }) => state(id)));
  expect([...states].sort()).toEqual(["released", "superseded", "superseded"]);
  const shown = await findSheets(database(), ["released"], { sort: "number", dir: "asc", page: 1, pageSize: 25 });
  expect(shown.rows.map(({ id }) => id)).toEqual(sheets.filter((_, i) => states[i] === "released").map(({ id }) => id));
});

it("does not change or lose a sheet after its release", async () => {
  const { id } = await draft("f");
  await releaseSheet(database(), { id, snapshot: { says: "frozen" }, by: null });
  const row = () => database()("sheets").where({ id });
  await expect(row().update({ snapshot: JSON.stringify({ says: "other" }) })).rejects.toThrow("does not change");
  await expect(row().update({ state: "draft", snapshot: null, released_at: null })).rejects.toThrow("does not change");
  await expect(row().delete()).rejects.toThrow("stays on record");
  await expect(deletePart(database(), partId)).rejects.toThrow("stays on record");
  expect((await findSheet(database(), every, id))?.snapshot).toEqual({ says: "frozen" });
  expect(await releaseSheet(database(), { id, snapshot: { says: "again" }, by: null })).toBeNull();
});

it("supersedes nothing when the release is refused", async () => {
  const { id: before } = await draft("g");
  await releaseSheet(database(), { id: before, snapshot: { says: "before" }, by: null });
  const { id } = await draft("h");
  await expect(releaseSheet(database(), { id, snapshot: { says: "half" }, by: "00000000-0000-4000-8000-000000000000" })).rejects.toThrow("sheets_released_by_fkey");
  expect([await state(before), await state(id)]).toEqual(["released", "draft"]);
});

it("is of the part and the machine that its plan is of", async () => {
  const other = await insertPart(database(), "B-2", bracketRevision());
  const { id: planId } = await plan(digest("i"));
  await expect(insertSheet(database(), { planId, partId: other.partId, machineId, by: null })).rejects.toThrow("sheets_plan_id_part_id_machine_id_fkey");
});
