import { beforeAll, describe, expect, it } from "vitest";
import { GET as getMaterial, PATCH as updateMaterial } from "@/app/api/materials/[id]/route";
import { POST as withdrawMaterial } from "@/app/api/materials/[id]/withdrawal/route";
import { GET as listMaterials, POST as createMaterial } from "@/app/api/materials/route";
import { POST as importMaterials } from "@/app/api/materials-table/route";
import { POST as addRevision } from "@/app/api/parts/[id]/revisions/route";
import { POST as createPart } from "@/app/api/parts/route";
import { POST as createSheet } from "@/app/api/plans/[id]/sheets/route";
import { GET as getSheet } from "@/app/api/sheets/[id]/route";
import { POST as releaseSheet } from "@/app/api/sheets/[id]/release/route";
import { GET as getSettings, PATCH as updateSettings } from "@/app/api/shop-settings/route";
import { mpa } from "@/bending/core/units";
import { defaultMethodFactors } from "@/bending/handbook/forceMethods";
import type { MaterialFacts } from "@/bending/handbook/material";
import { builtInMaterials, materialById } from "@/bending/handbook/materials";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { database } from "@/db/client";
import { findPlan } from "@/db/plans/findPlan";
import type { CsvImportAnswer } from "@/lib/schemas/csvImport";
import type { MaterialDetail, MaterialView } from "@/lib/schemas/materialViews";
import type { PartDetail, SheetDetail } from "@/lib/schemas/views";
import { exportMaterials } from "@/lib/services/materials/exportMaterials";
import { materialDrifts } from "@/lib/services/materials/materialDrifts";
import { inputsDigest } from "@/lib/services/plans/inputsDigest";
import { planInputs } from "@/lib/services/plans/planInputs";
import { storePlan } from "@/lib/services/plans/storePlan";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";
import { bracketPlan } from "./shop/bracketPlan";

const { call, machineId, person } = bracketCaller();
const steel = materialById("S235")!;
const detail = async (id: string) => (await call("engineer", getMaterial, `/api/materials/${id}`, { params: { id } })).body as unknown as MaterialDetail;
const change = (id: string, basedOn: number, facts: object, note = "") => call("engineer", updateMaterial, `/api/materials/${id}`, { params: { id }, body: { basedOn, facts, note } });
const withdraw = (id: string, withdrawn: boolean) => call("engineer", withdrawMaterial, `/api/materials/${id}/withdrawal`, { params: { id }, body: { withdrawn, note: "" } });
const events = async (action: string) => (await database()("audit_events").where({ action }).orderBy("id").select<{ subject: string; detail: string }[]>("subject", "detail"));
const newPart = (document: object = bracketDocument) => call("engineer", createPart, "/api/parts", { body: { document } });

describe("a material's versions", () => {
  it("begin with 1, and each change is another with who, why and what", async () => {
    expect((await detail("S275")).material).toMatchObject({ version: 1, withdrawn: null });
    const before = await detail("S275");
    const old = materialById("S275")!;
    const facts = { ...old, yield: 290, origins: { ...old.origins, yield: { kind: "shop", text: "certificate 4711" } } };
    const saved = await change("S275", 1, facts, "new supplier");
    expect(saved.status).toBe(200);
    const after = saved.body as unknown as MaterialDetail;
    expect(after.material).toMatchObject({ version: 2, yield: 290, changedBy: "The engineer", tensile: before.material.tensile });
    expect(after.versions.map(({ version, note, by }) => [version, note, by])).toEqual([[2, "new supplier", "The engineer"], [1, "", ""]]);
    expect(after.versions[0]?.changes).toEqual([{ field: "yield (MPa)", from: "275", to: "290" }, { field: "yield source", from: "published: EN 10025-2 table 7, up to 16 mm", to: "shop: certificate 4711" }]);
    expect(after.versions[1]?.facts.yield).toBe(275);
    expect(await events("changed a material")).toEqual([{ subject: "S275 version 2", detail: expect.stringContaining("yield (MPa): 275 -> 290") }]);
  });

  it("are refused when somebody was quicker, when nothing differs, when a value cannot be", async () => {
    const now = (await detail("S355")).material.version;
    const facts = materialById("S355")!;
    expect(await change("S355", now, facts)).toMatchObject({ status: 409, body: { detail: expect.stringContaining("Nothing differs") } });
    const both = await Promise.all([300, 310].map((strength) => change("S355", now, { ...facts, yield: strength })));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
    const refused = both.find(({ status }) => status === 409);
    expect(refused?.body.detail).toContain(`Version ${now + 1} was saved while you were changing version ${now}`);
    expect((await detail("S355")).versions).toHaveLength(2);
    const wrong = await change("S355", now + 1, { ...facts, tensile: [630, 470], modulus: 210_000_000, density: 7.85, yield: 0 });
    expect([wrong.status, wrong.body.errors]).toEqual([422, [
      { path: "facts.tensile[1]", message: "must be at least the lowest, 630 MPa" },
      { path: "facts.yield", message: "must be over 0 MPa" },
      { path: "facts.modulus", message: "must be 10 to 500 GPa; 210000 looks like MPa, which is 210 GPa" },
      { path: "facts.density", message: "must be 500 to 25000 kg/m³; 7.85 looks like g/cm³, which is 7850 kg/m³" },
    ]]);
    expect((await change("S355", now + 1, { ...facts, id: "S356" })).body.errors).toEqual([{ path: "facts.id", message: "must stay S355" }]);
    expect((await call("toolroom", updateMaterial, "/api/materials/S355", { params: { id: "S355" }, body: { basedOn: 2, facts } })).status).toBe(403);
    expect((await change("S999", 1, { ...facts, id: "S999" })).status).toBe(404);
  });

  it("stay on record whatever a program tries", async () => {
    const say = (work: Promise<unknown>) => work.then(() => "done", (thrown: Error) => thrown.message);
    expect(await say(database()("material_versions").where({ material_id: "S275" }).update({ note: "other" }))).toContain("stays on record");
    expect(await say(database()("material_versions").where({ material_id: "S275" }).delete())).toContain("stays on record");
    expect(await say(database().transaction((within) => within("materials").where({ id: "S275" }).update({ version: 9 })))).toContain("materials_version_exists");
  });
});

it("a new material is added once, and any part may be of it", async () => {
  const body = { facts: { ...steel, id: "Corten-B", name: "Weathering steel" }, note: "for mast feet" };
  expect(await call("engineer", createMaterial, "/api/materials", { body })).toMatchObject({ status: 201, body: { material: { id: "Corten-B", version: 1 }, parts: 0 } });
  const twice = await call("engineer", createMaterial, "/api/materials", { body });
  expect([twice.status, twice.body.errors?.[0]?.path]).toEqual([409, "facts.id"]);
  for (const id of ["new", "a/b", ""]) expect((await call("engineer", createMaterial, "/api/materials", { body: { ...body, facts: { ...body.facts, id } } })).status).toBe(422);
  expect((await newPart({ ...bracketDocument, material: "Corten-B" })).status).toBe(201);
  expect((await detail("Corten-B")).parts).toBe(1);
  expect((await events("added a material"))[0]).toEqual({ subject: "Corten-B Weathering steel", detail: "for mast feet" });
});

it("a withdrawn material is not for new parts; those of it keep working, and it can be brought back", async () => {
  const part = (await newPart({ ...bracketDocument, material: "DC04" })).body as unknown as PartDetail;
  expect(await withdraw("DC04", true)).toMatchObject({ status: 200, body: { material: { withdrawn: { by: "The engineer" } } } });
  expect((await withdraw("DC04", true)).status).toBe(409);
  const refused = await newPart({ ...bracketDocument, material: "DC04" });
  expect([refused.status, refused.body.errors?.[0]]).toEqual([422, { path: "document.material", message: expect.stringContaining("DC04 is withdrawn") }]);
  const path = `/api/parts/${part.id}/revisions`;
  expect((await call("engineer", addRevision, path, { params: { id: part.id }, body: { basedOn: 1, document: { ...bracketDocument, material: "DC04", name: "Still of it" } } })).status).toBe(201);
  expect((await planInputs(database(), { partId: part.id, machineId: machineId(), batch: 1 })).ok).toBe(true);
  const other = (await newPart()).body as unknown as PartDetail;
  expect((await call("engineer", addRevision, `/api/parts/${other.id}/revisions`, { params: { id: other.id }, body: { basedOn: 1, document: { ...bracketDocument, material: "DC04" } } })).status).toBe(422);
  const listed = (await call("manager", listMaterials, "/api/materials")).body as unknown as MaterialView[];
  expect(listed.filter(({ withdrawn }) => withdrawn !== null).map(({ id }) => id)).toEqual(["DC04"]);
  expect(await withdraw("DC04", false)).toMatchObject({ status: 200, body: { material: { withdrawn: null } } });
  expect((await newPart({ ...bracketDocument, material: "DC04" })).status).toBe(201);
  expect([(await events("withdrew a material")).length, (await events("brought a material back")).length]).toEqual([1, 1]);
});

describe("what was made of a material that has changed since", () => {
  let planId = "";
  let released: SheetDetail;
  let partId = "";
  const inputs = async () => {
    const found = await planInputs(database(), { partId, machineId: machineId(), batch: 20 });
    if (!found.ok) throw new Error(found.error.message);
    return found.value;
  };
  const digest = async () => inputsDigest(PLAN_ENGINE, (await inputs()).task);
  const sheet = async () => (await call("operator", getSheet, `/api/sheets/${released.id}`, { params: { id: released.id } })).body as unknown as SheetDetail;
  const drift = async () => (await materialDrifts(database(), [(await findPlan(database(), planId))!]))[0];
  beforeAll(async () => {
    partId = ((await newPart()).body as unknown as PartDetail).id;
    planId = await storePlan(person("engineer"), await inputs(), { plan: bracketPlan, ended: "itself", digest: await digest(), fromPlanId: null });
    const draft = (await call("engineer", createSheet, `/api/plans/${planId}/sheets`, { params: { id: planId } })).body as unknown as SheetDetail;
    released = (await call("engineer", releaseSheet, `/api/sheets/${draft.id}/release`, { params: { id: draft.id } })).body as unknown as SheetDetail;
  });

  it("a released sheet keeps its values, a new plan does not take the old one, and the drift is told", async () => {
    const [digestBefore, sheetBefore] = [await digest(), await sheet()];
    expect(await drift()).toEqual({ materialId: "S235", madeWith: 1, now: 1, changes: [], withdrawn: false });
    const renamed = await change("S235", 1, { ...steel, name: "Structural steel S235JR" });
    expect(renamed.status).toBe(200);
    expect(await drift()).toMatchObject({ madeWith: 1, now: 2, changes: [] });
    const facts = { ...steel, density: 7700, tensile: [380, 500], allowance: { rule: "k", k: 0.4 } };
    expect((await change("S235", 2, facts)).status).toBe(200);
    expect(await drift()).toEqual({
      materialId: "S235", madeWith: 1, now: 3, withdrawn: false,
      changes: [
        { field: "tensile lowest (MPa)", from: "360", to: "380" }, { field: "tensile highest (MPa)", from: "510", to: "500" },
        { field: "density (kg/m³)", from: "7850", to: "7700" }, { field: "K by", from: "din6935", to: "k" }, { field: "K", from: "", to: "0.4" },
      ],
    });
    expect(await digest()).not.toBe(digestBefore);
    expect(await sheet()).toEqual(sheetBefore);
    expect((await sheet()).view.source.material.density).toBe(7850);
    expect((await findPlan(database(), planId))?.material).toEqual(steel);
    const { plansByVersion, versions } = await detail("S235");
    expect(plansByVersion).toEqual({ [versions.at(-1)!.id]: 1 });
  });

  it("a plan from before versions were kept is compared by its values, and an unknown material is told", async () => {
    const old = { material: { ...steel, density: mpa(7000) as unknown as MaterialFacts["density"] }, material_version_id: null };
    const [first, second] = await materialDrifts(database(), [old, { ...old, material: { ...steel, id: "gone" } }]);
    expect([first?.madeWith, first?.changes.some(({ field }) => field.startsWith("density")), second]).toEqual([null, true, null]);
  });
});

describe("a table of materials", () => {
  const send = async (text: string, confirm?: object) => call("engineer", importMaterials, "/api/materials-table", { body: { text, fileName: "mill.csv", ...(confirm ? { confirm } : {}) } });
  const dry = async (text: string) => ((await send(text)).body as unknown as CsvImportAnswer).dryRun;
  const head = "short name,name,standard,group,tensile lowest (MPa),tensile highest (MPa),yield (MPa),modulus (GPa),density (g/cm³),straight length,natural radius per V,usual radius per thickness,K by";
  const table = `${head}\nDC01,Cold-rolled steel DC01,EN 10130,steel,270,400,280,210,7.85,medium,0.1666666667,1,din6935\nTi-2,Titanium grade 2,ASTM B265,steel,345,480,275,105,4.51,hard,0.2,2,machinery\n`;

  it("changes nothing when it is the shop's own, with either separator", async () => {
    for (const separator of ["comma", "semicolon"] as const) {
      const { counts } = await dry(await exportMaterials(separator));
      expect(counts).toEqual({ add: 0, change: 0, same: builtInMaterials.length + 1, refused: 0 });
    }
  });

  it("says what each line would do, and writes it only when confirmed: all of it, as versions", async () => {
    const dryRun = await dry(table);
    expect(dryRun.lines.map(({ label, fate }) => [label, fate])).toEqual([["DC01", "change"], ["Ti-2", "add"]]);
    expect(dryRun.lines[0]?.changes).toEqual([{ field: "tensile highest (MPa)", from: "410", to: "400" }, { field: "tensile source", from: expect.stringContaining("published: EN 10130"), to: "shop: imported from mill.csv" }]);
    expect((await detail("DC01")).material.version).toBe(1);
    expect((await send(table, { digest: "0".repeat(64) })).status).toBe(409);
    expect(await send(table, { digest: dryRun.digest })).toMatchObject({ status: 200, body: { written: true } });
    const [changed, added] = [await detail("DC01"), await detail("Ti-2")];
    expect(changed.material).toMatchObject({ version: 2, tensile: [270, 400], naturalRadiusRatio: 1 / 6, density: 7850 });
    expect(changed.versions[0]?.note).toBe("imported from mill.csv");
    expect(added.material).toMatchObject({ version: 1, modulus: 105_000, density: 4510, minimumRadii: null, origins: { density: { kind: "shop", text: "imported from mill.csv" } } });
    expect(await events("imported materials")).toEqual([{ subject: "2 of them", detail: "mill.csv: DC01, Ti-2" }]);
    expect((await dry(table)).counts).toEqual({ add: 0, change: 0, same: 2, refused: 0 });
  });

  it("is refused when the shop has changed since the dry run, or when lines are refused that were not left out", async () => {
    const text = `${head}\nDC01,Cold-rolled steel DC01,EN 10130,steel,270,390,280,210,7.85,medium,0.1666666667,1,din6935\nBad,Bad,X,steel,500,400,280,210,7850,medium,0.2,1,k\n`;
    const dryRun = await dry(text);
    expect(dryRun.lines[1]).toMatchObject({ fate: "refused", line: 3 });
    expect(dryRun.lines[1]?.problems.map(({ field, message }) => `${field}: ${message}`)).toEqual([
      "tensile highest (MPa): must be at least the lowest, 500 MPa", "density (kg/m³): must be 500 to 25000 kg/m³", "K: must be over 0 and at most 1",
    ]);
    expect((await send(text, { digest: dryRun.digest })).status).toBe(409);
    expect((await detail("DC01")).material.tensile[1]).toBe(400);
    await change("DC01", 2, { ...(await factsOf("DC01")), yield: 270 });
    expect(await send(text, { digest: dryRun.digest, leaveOutRefused: true })).toMatchObject({ status: 409, body: { detail: expect.stringContaining("changed since the dry run") } });
    const again = await dry(text);
    expect(await send(text, { digest: again.digest, leaveOutRefused: true })).toMatchObject({ status: 200 });
    expect((await detail("DC01")).material).toMatchObject({ version: 4, tensile: [270, 390], yield: 280 });
  });

  it("is for engineers; a file that cannot be read is refused as a whole", async () => {
    expect((await call("manager", importMaterials, "/api/materials-table", { body: { text: table } })).status).toBe(403);
    expect(await send("name,thickness\nx,1\n")).toMatchObject({ status: 422, body: { errors: [{ path: "text", message: expect.stringContaining('"short name" is missing') }] } });
  });
});

async function factsOf(id: string): Promise<MaterialFacts> {
  return (await detail(id)).versions[0]!.facts;
}

it("the shop's force factors are the defaults until an engineer sets others; everybody signed in reads them", async () => {
  const read = async () => (await call("operator", getSettings, "/api/shop-settings")).body;
  const set = (basedOn: number, forceFactors: object | null, role: "engineer" | "manager" = "engineer") => call(role, updateSettings, "/api/shop-settings", { body: { basedOn, forceFactors } });
  expect(await read()).toMatchObject({ forceFactors: defaultMethodFactors, forceIsDefault: true, forceVersion: 0 });
  const own = { air: 1.05, bottoming: 3.5, coining: 7, source: "read at the gauge" };
  expect((await set(0, own, "manager")).status).toBe(403);
  expect((await set(0, { ...own, bottoming: 8 })).body.errors).toEqual([{ path: "forceFactors.coining", message: "must be at least the factor of bottoming" }]);
  expect((await set(0, own)).status).toBe(200);
  expect((await set(0, { ...own, air: 1 })).status).toBe(409);
  expect(await read()).toMatchObject({ forceFactors: { air: 1.05, bottoming: 3.5, coining: 7 }, forceSource: "read at the gauge", forceIsDefault: false, forceVersion: 1, forceChangedBy: "The engineer" });
  expect((await set(1, null)).status).toBe(200);
  expect(await read()).toMatchObject({ forceFactors: defaultMethodFactors, forceIsDefault: true, forceVersion: 2 });
  expect(await events("changed the shop's settings")).toHaveLength(2);
});
