import { beforeAll, describe, expect, it } from "vitest";
import { bracketShop } from "@/tests/integration/shop/bracketShop";
import { openDatabase } from "@/tests/integration/openDatabase";
import { bendTrialFromRow } from "./bendTrialFromRow";
import { findAllTrials } from "./findAllTrials";
import { findInstruments } from "./findInstruments";
import { findTrialsById } from "./findTrialsById";
import { findTrials, type TrialSort } from "./findTrials";
import { insertInstrument } from "./insertInstrument";
import { insertTrials } from "./insertTrials";
import { judgeTrial } from "./judgeTrial";
import type { NewTrial } from "./newTrial";
import { withdrawInstrument } from "./withdrawInstrument";
import { bracketRevision } from "@/tests/integration/shop/bracketRevision";
import { deletePart } from "../parts/deletePart";
import { insertPart } from "../parts/insertPart";
import { insertUser } from "../users/insertUser";

const database = openDatabase();
const id = (index: number) => `00000000-0000-4000-8000-${String(index).padStart(12, "0")}`;
let calliper = "";
let protractor = "";
let person = "";

const trial = (index: number, change: Partial<NewTrial> = {}): NewTrial => ({
  id: id(index), material: "S235", batch: "A-1", nominalThicknessMm: 2, thicknessMm: 1.98, vOpeningMm: 16, punchRadiusMm: 0.8, angleDeg: 90, blankMm: 100,
  flangeAMm: 51.9, flangeBMm: 52, insideRadiusMm: null, lengthInstrumentId: calliper, thicknessInstrumentId: null, angleInstrumentId: protractor, radiusInstrumentId: null,
  measuredOn: "2025-03-01", measuredBy: "Greta Sommer", note: "", ...change,
});
const refused = async (work: Promise<unknown>): Promise<string> => {
  const thrown: unknown = await work.then(() => null, (error: unknown) => error);
  return thrown instanceof Error && "code" in thrown ? `${String(thrown.code)} ${"constraint" in thrown && typeof thrown.constraint === "string" ? thrown.constraint : thrown.message}` : `not refused: ${String(thrown)}`;
};

beforeAll(async () => {
  await bracketShop(database());
  const instruments = await findInstruments(database());
  calliper = instruments.find(({ kind }) => kind === "calliper")?.id ?? "";
  protractor = instruments.find(({ kind }) => kind === "protractor")?.id ?? "";
  person = (await insertUser(database(), { email: "e@bend.example", name: "An Engineer", role: "engineer", passwordHash: `$2b$04$${"a".repeat(53)}` })).id;
  await insertTrials(database(), [trial(1), trial(2, { flangeBMm: 52.02, note: "100 % flat" }), trial(3, { material: "1.4301", measuredOn: "2025-02-01" })], person);
});

describe("a trial is a record", () => {
  it("that is read back as it was put in, in the order of its number", async () => {
    const rows = await findAllTrials(database());
    expect(rows.map(({ number, id: own }) => [number, own])).toEqual([["T-1001", id(1)], ["T-1002", id(2)], ["T-1003", id(3)]]);
    expect(bendTrialFromRow(rows[1]!)).toMatchObject({
      units: "mm", material: "S235", nominalThickness: 2, thickness: 1.98, angle: 90, blankLength: 100, flanges: [51.9, 52.02], insideRadius: null, measuredOn: "2025-03-01", excluded: null,
      instruments: { length: { uncertainty: 0.03, resolution: 0.01 }, thickness: null, radius: null },
    });
  });

  it("that is kept once, however often the same line is sent", async () => {
    expect(await insertTrials(database(), [trial(1, { blankMm: 99 }), trial(4)], person)).toEqual([id(4)]);
    expect((await findAllTrials(database())).map(({ blank_mm: blank }) => blank)).toEqual([100, 100, 100, 100]);
  });

  it("whose measurements the database does not change and which it does not delete", async () => {
    const one = () => database()("bend_trials").where({ id: id(1) });
    for (const change of [{ flange_a_mm: 60 }, { material_id: "S355" }, { measured_on: "2025-03-02" }, { length_instrument_id: protractor }, { inside_radius_mm: 2, radius_instrument_id: calliper }]) {
      expect(await refused(one().update(change)), JSON.stringify(change)).toMatch(/^23001 .*T-1001 does not change/);
    }
    expect(await refused(one().delete())).toMatch(/^23001 .*stays on record/);
    expect(await one().update({ note: "seen again" })).toBe(1);
  });

  it("that stays when the part that it came from is deleted", async () => {
    const { partId } = await insertPart(database(), "B-1", bracketRevision());
    await insertTrials(database(), [trial(5, { partId })], person);
    expect((await findTrialsById(database(), [id(5)]))[0]).toMatchObject({ part_id: partId, part_number: "B-1" });
    await deletePart(database(), partId);
    expect((await findTrialsById(database(), [id(5)]))[0]).toMatchObject({ number: expect.stringMatching(/^T-/) as unknown, part_id: null, part_number: null });
    await judgeTrial(database(), id(5), { state: "withdrawn", reason: "only for this test" }, person);
  });

  it("that needs a material, an instrument and sizes that can be", async () => {
    for (const [change, rule] of [
      [{ material: "cheese" }, "23503 bend_trials_material_id_fkey"], [{ lengthInstrumentId: id(9) }, "23503 bend_trials_length_instrument_id_fkey"],
      [{ thicknessMm: 0 }, "23514 bend_trials_lengths"], [{ angleDeg: 180 }, "23514 bend_trials_angle"], [{ insideRadiusMm: 2 }, "23514 bend_trials_radius_has_instrument"],
      [{ measuredBy: " " }, "23514 bend_trials_measured_by_check"],
    ] as const) {
      expect(await refused(insertTrials(database(), [trial(8, change)], null))).toBe(rule);
    }
  });
});

describe("whether a trial counts", () => {
  it("is said with a reason, and taken back", async () => {
    expect(await refused(database()("bend_trials").where({ id: id(2) }).update({ excluded_at: new Date() }))).toBe("23514 bend_trials_excluded_with_reason");
    expect(await judgeTrial(database(), id(2), { state: "excluded", reason: "slipped" }, person)).toBe(true);
    const [row] = (await findTrials(database(), { sort: "number", dir: "asc", page: 1, pageSize: 25, state: "excluded" })).rows;
    expect(row).toMatchObject({ number: "T-1002", excluded_reason: "slipped", excluded_by_name: "An Engineer" });
    expect(bendTrialFromRow(row!).excluded).toMatchObject({ reason: "slipped", by: "An Engineer" });
    expect(await judgeTrial(database(), id(2), { state: "counted" }, person)).toBe(true);
    expect((await findTrials(database(), { sort: "number", dir: "asc", page: 1, pageSize: 25, state: "excluded" })).total).toBe(0);
  });

  it("is over once the trial is withdrawn", async () => {
    expect(await judgeTrial(database(), id(4), { state: "withdrawn", reason: "wrong strip" }, person)).toBe(true);
    expect(await judgeTrial(database(), id(4), { state: "counted" }, person)).toBe(false);
    expect(await refused(database()("bend_trials").where({ id: id(4) }).update({ withdrawn_at: null, withdrawn_by: null, withdrawn_reason: null }))).toMatch(/^23001 .*stays so/);
    expect((await findAllTrials(database())).map(({ number }) => number)).not.toContain("T-1005");
    expect(await findAllTrials(database(), { withdrawn: true })).toHaveLength(5);
  });
});

describe("lists of trials", () => {
  it("sort by every column that they name and search in words", async () => {
    const columns: readonly TrialSort[] = ["number", "material", "batch", "thickness", "vOpening", "punchRadius", "angle", "measuredOn", "measuredBy"];
    for (const sort of columns) expect((await findTrials(database(), { sort, dir: "desc", page: 1, pageSize: 25 })).rows).toHaveLength(5);
    expect((await findTrials(database(), { sort: "number", dir: "asc", page: 1, pageSize: 25, q: "100 %" })).rows.map(({ number }) => number)).toEqual(["T-1002"]);
    expect((await findTrials(database(), { sort: "number", dir: "asc", page: 1, pageSize: 25, material: "1.4301", state: "counted" })).total).toBe(1);
  });
});

describe("instruments", () => {
  it("have a name of their own among those in use, an error over 0, and stay with their trials when withdrawn", async () => {
    const own = { name: "calliper 0.01", kind: "calliper", resolution: 0.01, uncertainty: 0.02, note: "" } as const;
    expect(await refused(insertInstrument(database(), own, person))).toBe("23505 instruments_name_taken");
    expect(await refused(insertInstrument(database(), { ...own, name: "No error", uncertainty: 0 }, person))).toBe("23514 instruments_uncertainty_over_zero");
    expect(await withdrawInstrument(database(), calliper, "dropped", person)).toBe(true);
    expect(await withdrawInstrument(database(), calliper, "dropped", person)).toBe(false);
    expect(await insertInstrument(database(), own, person)).toMatch(/^[0-9a-f-]{36}$/);
    const old = (await findInstruments(database())).find((one) => one.id === calliper);
    expect(old).toMatchObject({ trials: 3, withdrawn_reason: "dropped", withdrawn_by_name: "An Engineer" });
    expect((await findAllTrials(database()))[0]?.length_instrument).toMatchObject({ name: "Calliper 0.01", uncertainty: 0.03 });
  });
});
