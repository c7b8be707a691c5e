import { describe, expect, it } from "vitest";
import { GET as coverage } from "@/app/api/bend-table/coverage/route";
import { POST as importFile } from "@/app/api/bend-table/import/route";
import { GET as instrumentList, POST as addInstrument } from "@/app/api/bend-table/instruments/route";
import { GET as valueList } from "@/app/api/bend-table/route";
import { PATCH as judge } from "@/app/api/bend-table/trials/[id]/route";
import { GET as trialList, POST as addTrials } from "@/app/api/bend-table/trials/route";
import { GET as value } from "@/app/api/bend-table/values/[key]/route";
import { database } from "@/db/client";
import { valueSorts } from "@/lib/schemas/bendTableInputs";
import type { AddedTrials, CoverageView, InstrumentView, TrialView, ValueDetail, ValueItem } from "@/lib/schemas/bendTableViews";
import type { CsvImportAnswer } from "@/lib/schemas/csvImport";
import type { Page } from "@/lib/schemas/views";
import { exportTrials } from "@/lib/services/bendTable/exportTrials";
import { exportValues } from "@/lib/services/bendTable/exportValues";
import { bracketCaller, type Answer } from "./shop/bracketCaller";

const { call } = bracketCaller();
const id = (index: number) => `00000000-0000-4000-8000-${String(index).padStart(12, "0")}`;
const as = <T>(answer: Answer): T => answer.body as unknown as T;
const count = async (table: string) => Number((await database()(table).count({ n: "*" }).first() as { n: string }).n);

async function line(index: number, change: object = {}) {
  const instruments = as<readonly InstrumentView[]>(await call("toolroom", instrumentList, "/api/bend-table/instruments"));
  const of = (kind: string) => instruments.find((one) => one.kind === kind)?.id;
  return {
    id: id(index), material: "S235", batch: "A-1", thickness: 1.98, vOpening: 16, punchRadius: 0.8, angle: 90, blank: 100, flangeA: 51.96, flangeB: 51.98,
    lengthInstrument: of("calliper"), thicknessInstrument: of("micrometer"), angleInstrument: of("protractor"), measuredOn: "2025-03-01", measuredBy: "Greta Sommer", ...change,
  };
}
const save = async (lines: readonly object[], units = "mm") => call("toolroom", addTrials, "/api/bend-table/trials", { body: { units, lines } });
const key = "S235 2 V16 R0.8 90deg";
const detail = async () => as<ValueDetail>(await call("operator", value, `/api/bend-table/values/${encodeURIComponent(key)}`, { params: { key } }));

describe("a page of the notebook", () => {
  it("is saved as a whole, in either unit, with its event; sent again it changes nothing", async () => {
    const inches = { thickness: 1.98 / 25.4, nominal: 2 / 25.4, vOpening: 16 / 25.4, punchRadius: 0.8 / 25.4, blank: 100 / 25.4, flangeA: 51.96 / 25.4, flangeB: 51.98 / 25.4 };
    const first = await save([await line(1), await line(2, { flangeB: 52, note: "second" })]);
    expect(first.status).toBe(201);
    expect((await save([await line(3, inches)], "in")).status).toBe(201);
    const again = as<AddedTrials>(await save([await line(1), await line(2)]));
    expect(again).toMatchObject({ known: 2, trials: [{ number: "T-1001", note: "" }, { number: "T-1002", note: "second" }] });
    const { items } = as<Page<TrialView>>(await call("operator", trialList, "/api/bend-table/trials?sort=number&dir=asc"));
    expect(items.map(({ number, valueKey }) => [number, valueKey])).toEqual([["T-1001", key], ["T-1002", key], ["T-1003", key]]);
    expect(items[2]?.result?.deduction.value).toBeCloseTo(items[0]?.result?.deduction.value ?? 0, 9);
    expect(items[0]?.result?.deduction.value).toBeCloseTo(3.94, 9);
    expect(await database()("audit_events").where({ action: "entered bend trials" }).orderBy("id").pluck("detail")).toEqual(["T-1001, T-1002", "T-1003"]);
  });

  it.each<[string, object, string, RegExp]>([
    ["a material that is not there", { material: "cheese" }, "material", /cheese/],
    ["a thickness of 0", { thickness: 0 }, "thickness", /more than 0 mm/],
    ["a V that the sheet does not go into", { vOpening: 3 }, "vOpening", /does not go into/],
    ["an angle of 180", { angle: 180 }, "angle", /less than 180/],
    ["a blank that no neutral line allows", { blank: 90 }, "blank", /would be right/],
    ["another sheet's thickness", { nominal: 3 }, "thickness", /named 3/],
    ["an inside radius without an instrument", { insideRadius: 2.5 }, "radiusInstrument", /exactly when/],
    ["an instrument that is not there", { lengthInstrument: id(99) }, "lengthInstrument", /no instrument in use/],
    ["a day to come", { measuredOn: "2999-01-01" }, "measuredOn", /to come/],
    ["a part that is not there", { partId: id(99) }, "partId", /no part/],
    ["a name of no one", { measuredBy: " " }, "measuredBy", /empty/],
  ])("is refused as a whole for %s", async (_what, change, field, words) => {
    const before = [await count("bend_trials"), await count("audit_events")];
    const answer = await save([await line(50), await line(51, change)]);
    expect(answer.status).toBe(422);
    expect(answer.body.errors?.find(({ path }) => path === `lines[1].${field}`)?.message, JSON.stringify(answer.body)).toMatch(words);
    expect([await count("bend_trials"), await count("audit_events")]).toEqual(before);
  });

  it("is refused with a calliper for the angle, a protractor for a length, or two lines of one id", async () => {
    const good = await line(60);
    const turned = await save([{ ...good, angleInstrument: good.lengthInstrument, lengthInstrument: good.angleInstrument }]);
    expect(turned.body.errors?.map(({ path }) => path).sort()).toEqual(["lines[0].angleInstrument", "lines[0].lengthInstrument"]);
    expect((await save([good, good])).body.errors?.map(({ path }) => path)).toEqual(["lines[1].id"]);
  });
});

describe("a value", () => {
  it("is the mean of its trials beside the handbook, and every list sorts it", async () => {
    for (const sort of valueSorts) {
      const listed = await call("manager", valueList, `/api/bend-table?sort=${sort}&dir=desc&q=v16+s235`);
      expect([sort, as<Page<ValueItem>>(listed).items.map((item) => item.key)]).toEqual([sort, [key]]);
    }
    const found = await detail();
    expect(found).toMatchObject({ state: "ok", counted: 3, excluded: 0, outliers: 0, thicknessMm: 2, handbook: { source: "DIN 6935" } });
    expect(found.trials).toHaveLength(3);
    expect(found.handbook.deductionMm).toBeCloseTo(found.handbookMm ?? 0, 12);
  });

  it("leaves out what the engineer excludes, counts what is brought back, and forgets what is withdrawn", async () => {
    const before = (await detail()).k ?? 0;
    const patch = (role: "engineer" | "toolroom", body: object, of = 2) => call(role, judge, `/api/bend-table/trials/${id(of)}`, { params: { id: id(of) }, body });
    expect((await patch("toolroom", { state: "excluded", reason: "slipped" })).status).toBe(403);
    expect((await patch("engineer", { state: "excluded", reason: "  " })).body.errors?.[0]).toMatchObject({ path: "reason", message: "say why" });
    expect((await patch("engineer", { state: "excluded", reason: "slipped" })).body).toMatchObject({ state: "excluded", excluded: { reason: "slipped", by: "The engineer" } });
    const less = await detail();
    expect(less).toMatchObject({ counted: 2, excluded: 1, state: "few" });
    expect(less.trials).toHaveLength(3);
    expect(less.k).not.toBeCloseTo(before, 6);
    await patch("engineer", { state: "counted" });
    expect((await detail()).k).toBeCloseTo(before, 12);
    await patch("engineer", { state: "withdrawn", reason: "wrong strip" });
    expect((await detail()).trials).toHaveLength(2);
    expect((await patch("engineer", { state: "counted" })).status).toBe(409);
    expect((await patch("engineer", { state: "counted" }, 77)).status).toBe(404);
    expect(await database()("audit_events").whereLike("action", "%bend trial").orderBy("id").pluck("action")).toEqual(["excluded a bend trial", "brought back a bend trial", "withdrew a bend trial"]);
  });

  it("that is not there is not found", async () => {
    expect((await call("engineer", value, "/api/bend-table/values/x", { params: { key: "x" } })).status).toBe(404);
  });
});

describe("files", () => {
  const send = async (text: string, confirm?: object) => call("toolroom", importFile, "/api/bend-table/import", { body: { text, fileName: "trials.csv", ...(confirm === undefined ? {} : { confirm }) } });

  it.each([["comma", ","], ["semicolon", ";"]] as const)("read back what was written with a %s: every line is as it is", async (_name, separator) => {
    const { dryRun } = as<CsvImportAnswer>(await send(await exportTrials(undefined, separator)));
    expect(dryRun.counts).toEqual({ add: 0, change: 0, same: 3, refused: 0 });
  });

  it("add what is new once, know it again without its number, and never change a measurement", async () => {
    const rows = [
      "material,thickness (in),nominal thickness (in),v opening (mm),punch radius (mm),angle,blank (mm),flange 1 (mm),flange 2 (mm),length instrument,angle instrument,measured on,measured by",
      "S235,0.0591,0.0591,10,0.8,90,100,51.43,51.43,calliper 0.01,Protractor 5 minutes,2025-11-03,Owen Pritchard",
      "S235,0.0591,0.0591,10,0.8,90,100,51.43,61.43,calliper 0.01,Protractor 5 minutes,2025-11-03,Owen Pritchard",
    ];
    const before = await count("bend_trials");
    const { dryRun } = as<CsvImportAnswer>(await send(rows.join("\n")));
    expect(dryRun.counts).toEqual({ add: 1, change: 0, same: 0, refused: 1 });
    expect(dryRun.lines[1]?.problems[0]).toMatchObject({ field: "blank (mm)" });
    expect(await count("bend_trials")).toBe(before);
    expect((await send(rows.join("\n"), { digest: dryRun.digest })).status).toBe(409);
    const written = await send(rows.join("\n"), { digest: dryRun.digest, leaveOutRefused: true });
    expect(as<CsvImportAnswer>(written).written).toBe(true);
    expect(await count("bend_trials")).toBe(before + 1);
    expect(as<CsvImportAnswer>(await send(rows.join("\n"))).dryRun.counts).toMatchObject({ add: 0, same: 1 });
    const changed = (await exportTrials("S235", ",")).replace("51.96", "51.97");
    const refused = as<CsvImportAnswer>(await send(changed)).dryRun;
    expect(refused.counts.refused).toBe(1);
    expect(refused.lines.find(({ fate }) => fate === "refused")?.problems[0]?.message).toContain("does not change");
  });

  it("of values name each value, its state and the handbook's number", async () => {
    const [head, ...lines] = (await exportValues(undefined, ",")).trim().split("\r\n");
    expect(head).toContain("deduction (mm)");
    expect(lines).toHaveLength(2);
    expect(lines[1]).toMatch(/^S235,2,16,0\.8,90,.*fewer than three trials$/);
  });
});

describe("coverage", () => {
  it("shows what was measured over the dies in service, and what to bend next", async () => {
    const found = as<CoverageView>(await call("operator", coverage, "/api/bend-table/coverage?material=S235"));
    expect(found.openings).toEqual([{ vOpeningMm: 10, inService: false }, { vOpeningMm: 16, inService: true }]);
    expect(found.rows.map((row) => [row.thicknessMm, row.cells.map(({ kind }) => kind)])).toEqual([[1.5, ["measured", "open"]], [2, ["open", "measured"]]]);
    expect(found.suggestions.map(({ thicknessMm, vOpeningMm, pieces }) => [thicknessMm, vOpeningMm, pieces])).toEqual([[1.5, 16, 3], [2, 16, 1]]);
    expect((await call("operator", coverage, "/api/bend-table/coverage?material=cheese")).status).toBe(404);
    expect((await call("operator", coverage, "/api/bend-table/coverage")).status).toBe(400);
  });
});

it("an instrument is added by the toolroom, not by an operator, and its name is its own", async () => {
  const body = { name: "Calliper 7", kind: "calliper", resolution: 0, uncertainty: 0.02 };
  expect((await call("operator", addInstrument, "/api/bend-table/instruments", { body })).status).toBe(403);
  expect((await call("toolroom", addInstrument, "/api/bend-table/instruments", { body })).status).toBe(201);
  const taken = await call("toolroom", addInstrument, "/api/bend-table/instruments", { body: { ...body, name: "CALLIPER 7" } });
  expect([taken.status, taken.body.errors?.[0]?.path]).toEqual([409, "name"]);
  expect((await call("toolroom", addInstrument, "/api/bend-table/instruments", { body: { ...body, name: "x", uncertainty: 0 } })).body.errors?.[0]?.path).toBe("uncertainty");
});
