import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, it } from "vitest";
import { mm } from "@/bending/core/units";
import { materialById } from "@/bending/handbook/materials";
import type { PartDocument } from "@/bending/part/partDocument";
import { GET as getValue } from "@/app/api/bend-table/values/[key]/route";
import { GET as getPart } from "@/app/api/parts/[id]/route";
import { POST as addRevision } from "@/app/api/parts/[id]/revisions/route";
import { GET as listParts, POST as createPart } from "@/app/api/parts/route";
import { POST as createSheet } from "@/app/api/plans/[id]/sheets/route";
import { GET as getSheet } from "@/app/api/sheets/[id]/route";
import { POST as releaseSheet } from "@/app/api/sheets/[id]/release/route";
import { GET as listSheets } from "@/app/api/sheets/route";
import { GET as getShopTable } from "@/app/api/shop-table/route";
import { findInstruments } from "@/db/bendTrials/findInstruments";
import { insertTrials } from "@/db/bendTrials/insertTrials";
import { judgeTrial } from "@/db/bendTrials/judgeTrial";
import { database } from "@/db/client";
import { insertMaterialVersion } from "@/db/materials/insertMaterialVersion";
import { insertPlan } from "@/db/plans/insertPlan";
import { runPlanTask } from "@/lib/jobs/runPlanTask";
import type { ValueDetail } from "@/lib/schemas/bendTableViews";
import type { FlatChange, Page, PartDetail, PartListItem, SheetDetail, SheetListItem } from "@/lib/schemas/views";
import { inputsDigest } from "@/lib/services/plans/inputsDigest";
import { planInputs } from "@/lib/services/plans/planInputs";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";

const VALUE = "S235 2 V16 R0.8 90deg";
const { call, machineId, person } = bracketCaller();
const document: PartDocument = Object.fromEntries(Object.entries(bracketDocument).filter(([key]) => key !== "rule" && key !== "kFactor")) as unknown as PartDocument;
let part: PartDetail;
beforeAll(async () => {
  part = (await call("engineer", createPart, "/api/parts", { body: { document } })).body as unknown as PartDetail;
});

/** Two legs of 40 and 60 over the V 16 that the shop has: what comes of the deduction is 100 minus the blank. */
async function measure(deduction: number, changes: { readonly vOpeningMm?: number; readonly measuredOn?: string } = {}): Promise<string> {
  const instruments = await findInstruments(database());
  const of = (kind: string) => instruments.find((one) => one.kind === kind)!.id;
  const id = randomUUID();
  await insertTrials(database(), [{
    id, material: "S235", batch: "heat 7", nominalThicknessMm: 2, thicknessMm: 2, vOpeningMm: 16, punchRadiusMm: 0.8, angleDeg: 90, blankMm: 100 - deduction, flangeAMm: 40, flangeBMm: 60,
    insideRadiusMm: null, lengthInstrumentId: of("calliper"), thicknessInstrumentId: null, angleInstrumentId: of("protractor"), radiusInstrumentId: null,
    measuredOn: "2026-11-30", measuredBy: "Greta", note: "", ...changes,
  }], null);
  return id;
}

/** Plans with what the shop knows now, and releases the sheet. */
async function released(of: PartDetail = part): Promise<SheetDetail> {
  const inputs = await planInputs(database(), { partId: of.id, machineId: machineId(), batch: 20 });
  if (!inputs.ok) throw new Error(JSON.stringify(inputs.error));
  const { task, revisionId, machineDocument, materialVersionId } = inputs.value;
  const { plan } = runPlanTask(task, { onProgress: () => undefined, finishAsked: () => false });
  const { id } = await insertPlan(database(), {
    partId: of.id, revisionId, machineId: machineId(), plan, material: task.material, materialVersionId, machineDocument, tools: task.tools, inputsDigest: inputsDigest("1", task), by: null,
    origin: "planned", fromPlanId: null, ended: "itself", limitMs: task.limitMs, asked: {},
  });
  const sheet = (await call("engineer", createSheet, `/api/plans/${id}/sheets`, { params: { id } })).body as unknown as SheetDetail;
  expect(sheet.flatChange).toBeNull();
  return (await call("engineer", releaseSheet, `/api/sheets/${sheet.id}/release`, { params: { id: sheet.id } })).body as unknown as SheetDetail;
}
const sheet = async (id: string) => (await call("operator", getSheet, `/api/sheets/${id}`, { params: { id } })).body as unknown as SheetDetail;
const listed = async <T extends { readonly flatChange: FlatChange | null }>(role: "operator" | "engineer", list: typeof listSheets | typeof listParts, path: string) => ((await call(role, list, path)).body as unknown as Page<T>).items;
const partNow = async () => (await call("engineer", getPart, `/api/parts/${part.id}`, { params: { id: part.id } })).body as unknown as PartDetail;

describe("a flat that comes out differently after it was released", () => {
  it("is flagged on the sheet, in the lists and on the part, with what changed; the sheet stays as it is", async () => {
    const before = await released();
    expect(before.view.flat.bends[0]).toMatchObject({ source: expect.stringContaining("DIN 6935") });
    for (const deduction of [4, 4.02, 3.98]) await measure(deduction);
    const flagged = await sheet(before.id);
    expect(flagged.view).toEqual(before.view);
    expect(flagged.flatChange).toEqual({ units: "mm", thenMm: [expect.closeTo(96.163, 3), 150], nowMm: [expect.closeTo(96, 6), 150], why: ["S235 2 mm, V 16 mm, 90°: 3 new trials on 2026-11-30"] });
    expect((await listed<SheetListItem>("operator", listSheets, "/api/sheets")).map(({ flatChange }) => flatChange)).toEqual([flagged.flatChange]);
    // Nobody has said what the part is bent on: it goes by the V of its radius, which the shop has not measured.
    expect((await partNow()).flatChange).toBeNull();
    await measure(3.7, { vOpeningMm: 12, measuredOn: "2026-12-01" });
    expect((await partNow()).flatChange).toMatchObject({ nowMm: [expect.closeTo(96.3, 6), 150], why: ["S235 2 mm, V 12 mm, 90°: 1 new trial on 2026-12-01"] });
    expect((await listed<PartListItem>("engineer", listParts, "/api/parts")).map(({ flatChange }) => flatChange?.nowMm)).toEqual([[expect.closeTo(96.3, 6), 150]]);
    expect((await sheet(before.id)).flatChange?.nowMm[0]).toBeCloseTo(96, 6);
  });

  it("is no longer so once the part is planned again and that sheet supersedes the first", async () => {
    const after = await released();
    expect(after).toMatchObject({ state: "released", flatChange: null });
    expect(after.view.flat.bends[0]?.source).toContain("3 trials");
    const value = (await call("operator", getValue, `/api/bend-table/values/${encodeURIComponent(VALUE)}`, { params: { key: VALUE } })).body as unknown as ValueDetail;
    expect(value).toMatchObject({ counted: 3, lastUsed: { partId: part.id, partNumber: part.number } });
    const seen = await listed<SheetListItem>("engineer", listSheets, "/api/sheets");
    expect(seen.map(({ state, flatChange }) => [state, flatChange]).sort()).toEqual([["released", null], ["superseded", null]]);
  });

  it("says when a trial was left out, withdrawn, or the material has a new version", async () => {
    const { id } = await released();
    const [wild, wrong] = [await measure(4.4), await measure(4.2)];
    const current = await released();
    expect([(await sheet(current.id)).flatChange, current.id === id]).toEqual([null, false]);
    await judgeTrial(database(), wild, { state: "excluded", reason: "the strip slipped" }, person("engineer").id);
    await judgeTrial(database(), wrong, { state: "withdrawn", reason: "measured another sheet" }, person("engineer").id);
    expect((await sheet(current.id)).flatChange).toMatchObject({ nowMm: [expect.closeTo(96, 6), 150], why: ["S235 2 mm, V 16 mm, 90°: 1 left out, 1 withdrawn"] });
    await judgeTrial(database(), wild, { state: "counted" }, person("engineer").id);
    const fresh = await released();
    const steel = { ...materialById("S235")!, allowance: { rule: "k", k: 0.5 } as const };
    await insertMaterialVersion(database(), 1, steel, { note: "our own K", by: null });
    // The shop's own value goes before the material's rule: nothing changes, and nothing is flagged.
    expect((await sheet(fresh.id)).flatChange).toBeNull();
    await insertMaterialVersion(database(), 2, { ...steel, naturalRadiusRatio: 0.2 }, { note: "softer", by: null });
    expect((await sheet(fresh.id)).flatChange).toBeNull();
  });

  it("names the material's new version where the flat follows from it", async () => {
    const made = (await call("engineer", createPart, "/api/parts", { body: { document: { ...document, material: "DC04" } } })).body as unknown as PartDetail;
    const { id, view } = await released(made);
    await insertMaterialVersion(database(), 1, { ...materialById("DC04")!, allowance: { rule: "k", k: 0.45 } }, { note: "measured", by: null });
    const seen = await sheet(id);
    expect(seen.view).toEqual(view);
    // 2 x 4 - pi / 2 x (2 + 0.45 x 2) off the two legs.
    expect(seen.flatChange).toMatchObject({ nowMm: [expect.closeTo(92 + (Math.PI / 2) * 2.9, 6), 150], why: [expect.stringMatching(/^DC04: version 2 of \d{4}-\d\d-\d\d$/)] });
  });

  it("of a part is settled by its next revision", async () => {
    expect((await partNow()).flatChange).not.toBeNull();
    const path = `/api/parts/${part.id}/revisions`;
    await call("engineer", addRevision, path, { params: { id: part.id }, body: { basedOn: 1, document } });
    expect((await partNow()).flatChange).toBeNull();
    expect((await listed<PartListItem>("engineer", listParts, "/api/parts?material=S235"))[0]).toMatchObject({ flatChange: null, flatWidthMm: expect.closeTo(92 + (Math.PI / 2) * 3, 6) });
  });

  it("is computed with the same values in the browser", async () => {
    const { status, body } = await call("engineer", getShopTable, "/api/shop-table?material=S235");
    expect(status).toBe(200);
    expect(body["cells"]).toMatchObject([{ vOpening: mm(12), trials: [] }, { vOpening: mm(16), trials: [] }]);
    expect((await call("engineer", getShopTable, "/api/shop-table?material=1.4301")).body["cells"]).toEqual([]);
    expect((await call("engineer", getShopTable, "/api/shop-table")).status).toBe(400);
  });
});
