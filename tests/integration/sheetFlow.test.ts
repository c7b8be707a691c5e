import { beforeAll, describe, expect, it } from "vitest";
import { builtInMaterials } from "@/bending/handbook/materials";
import { DELETE as deletePart, GET as getPart } from "@/app/api/parts/[id]/route";
import { POST as addRevision } from "@/app/api/parts/[id]/revisions/route";
import { GET as getDocument } from "@/app/api/parts/[id]/document/route";
import { POST as createPart } from "@/app/api/parts/route";
import { PATCH as updatePiece } from "@/app/api/pieces/[id]/route";
import { GET as getPlan } from "@/app/api/plans/[id]/route";
import { POST as createSheet } from "@/app/api/plans/[id]/sheets/route";
import { GET as getSheet } from "@/app/api/sheets/[id]/route";
import { POST as releaseSheet } from "@/app/api/sheets/[id]/release/route";
import { GET as listSheets } from "@/app/api/sheets/route";
import { database } from "@/db/client";
import { insertPlan } from "@/db/plans/insertPlan";
import { findPieces } from "@/db/tools/findPieces";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PartDetail, PlanDetail, SheetDetail } from "@/lib/schemas/views";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";
import { bracketMachine } from "./shop/bracketMachine";
import { bracketPlan } from "./shop/bracketPlan";
import { bracketDie, bracketPunch } from "./shop/bracketTools";

const { call, machineId } = bracketCaller();
let part: PartDetail;
beforeAll(async () => {
  const answer = await call("engineer", createPart, "/api/parts", { body: { document: bracketDocument, note: "first" } });
  part = answer.body as unknown as PartDetail;
});

const planned = async (letter: string, changes: Partial<PlanDocument> = {}): Promise<string> => (await insertPlan(database(), {
  partId: part.id, revisionId: part.revision.id, machineId: machineId(), plan: { ...bracketPlan, ...changes },
  material: builtInMaterials.find(({ id }) => id === "S235")!, materialVersionId: null, machineDocument: bracketMachine, tools: [bracketPunch, bracketDie], inputsDigest: letter.repeat(64), by: null,
  origin: "planned", fromPlanId: null, ended: "itself", limitMs: 60_000, asked: {},
})).id;
const draft = async (letter: string): Promise<SheetDetail> => {
  const id = await planned(letter);
  return (await call("engineer", createSheet, `/api/plans/${id}/sheets`, { params: { id } })).body as unknown as SheetDetail;
};
const release = (id: string) => call("engineer", releaseSheet, `/api/sheets/${id}/release`, { params: { id } });
const sheet = (role: "engineer" | "operator", id: string) => call(role, getSheet, `/api/sheets/${id}`, { params: { id } });
const rackOf = (detail: SheetDetail) => detail.view.pickList.find(({ piece }) => piece === "P-1-200-1")?.rack;
const changePiece = async (change: object) => {
  const id = (await findPieces(database(), { toolCodes: ["P-1"] })).find(({ code }) => code === "P-1-200-1")!.id;
  return call("toolroom", updatePiece, `/api/pieces/${id}`, { params: { id }, body: change });
};

describe("a setup sheet", () => {
  it("begins as a draft that the floor does not see", async () => {
    const made = await draft("1");
    expect(made).toMatchObject({ state: "draft", partNumber: part.number, revision: 1, machine: "Test brake", bends: 1, batch: 20, latestRevision: 1 });
    expect(made.view.header.number).toBe(made.number);
    expect((await sheet("operator", made.id)).status).toBe(404);
    expect((await call("operator", listSheets, "/api/sheets")).body).toMatchObject({ total: 0 });
    expect((await call("operator", listSheets, "/api/sheets?state=draft")).body).toMatchObject({ total: 0 });
    expect((await call("engineer", listSheets, "/api/sheets")).body).toMatchObject({ total: 1 });
  });

  it("is frozen by its release and seen by the floor; a draft follows the racks", async () => {
    const made = await draft("2");
    expect(rackOf(made)).toBe("A1");
    await changePiece({ rack: "C7" });
    expect(rackOf((await sheet("engineer", made.id)).body as unknown as SheetDetail)).toBe("C7");
    expect(await release(made.id)).toMatchObject({ status: 200, body: { state: "released", releasedBy: "The engineer" } });
    await changePiece({ rack: "D8" });
    const seen = await sheet("operator", made.id);
    expect([seen.status, rackOf(seen.body as unknown as SheetDetail)]).toEqual([200, "C7"]);
    expect((await release(made.id)).status).toBe(409);
  });

  it("supersedes the one released before for the same part and machine", async () => {
    const before = (await call("operator", listSheets, "/api/sheets")).body["items"] as SheetDetail[];
    const made = await draft("3");
    await release(made.id);
    const after = (await call("operator", listSheets, "/api/sheets")).body["items"] as SheetDetail[];
    expect([before.length, after.map(({ id }) => id)]).toEqual([1, [made.id]]);
    expect((await sheet("engineer", before[0]!.id)).body).toMatchObject({ state: "superseded" });
    const gone = await sheet("operator", before[0]!.id);
    expect([gone.status, gone.body.detail]).toEqual([404, expect.stringContaining("superseded")]);
  });

  it("is not released while a piece of it is out of service", async () => {
    const made = await draft("4");
    await changePiece({ state: "at regrind" });
    const refused = await release(made.id);
    expect([refused.status, refused.body.detail]).toEqual([409, expect.stringContaining("P-1-200-1 (at regrind)")]);
    expect((await sheet("engineer", made.id)).body).toMatchObject({ state: "draft" });
    await changePiece({ state: "in rack" });
    expect((await release(made.id)).status).toBe(200);
  });

  it("is not made of a plan that cannot be made or is undecided", async () => {
    const reason = { kind: "no-punch", bends: ["b1"], faces: [], tools: [], message: "No punch is narrow enough." } as const;
    for (const [letter, changes, words] of [["5", { status: "infeasible", steps: [], reasons: [reason] }, "No punch is narrow enough."], ["6", { status: "unknown", steps: [] }, "undecided"]] as const) {
      const id = await planned(letter, changes);
      const refused = await call("engineer", createSheet, `/api/plans/${id}/sheets`, { params: { id } });
      expect([refused.status, refused.body.detail]).toEqual([409, expect.stringContaining(words)]);
    }
  });

  it("keeps its part on record", async () => {
    const refused = await call("engineer", deletePart, `/api/parts/${part.id}`, { params: { id: part.id } });
    expect([refused.status, refused.body.detail]).toEqual([409, expect.stringContaining("stays on record")]);
    const seen = await call("engineer", getPart, `/api/parts/${part.id}`, { params: { id: part.id } });
    expect((seen.body as unknown as PartDetail).plans.length).toBeGreaterThan(0);
  });
});

it("a plan gives what it was made of", async () => {
  const id = await planned("7");
  const plan = (await call("manager", getPlan, `/api/plans/${id}`, { params: { id } })).body as unknown as PlanDetail;
  expect(plan).toMatchObject({ plan: bracketPlan, document: bracketDocument, machineDocument: bracketMachine, tools: [{ id: "P-1" }, { id: "V-16" }] });
  expect(plan.machineModel.bedLength).toBe(1250);
});

describe("a revision", () => {
  it("is refused when somebody was quicker, and then nothing is saved", async () => {
    const body = { basedOn: 1, document: { ...bracketDocument, name: "Bracket, wider" } };
    const path = `/api/parts/${part.id}/revisions`;
    expect(await call("engineer", addRevision, path, { params: { id: part.id }, body })).toMatchObject({ status: 201, body: { revision: { revision: 2 }, name: "Bracket, wider" } });
    const stale = await call("engineer", addRevision, path, { params: { id: part.id }, body });
    expect([stale.status, stale.body.detail]).toEqual([409, expect.stringContaining("Revision 2 was saved while you were changing revision 1")]);
    const seen = (await call("toolroom", getPart, `/api/parts/${part.id}?revision=1`, { params: { id: part.id } })).body as unknown as PartDetail;
    expect([seen.name, seen.revisions.length, seen.plans]).toEqual(["Bracket", 2, []]);
  });

  it("gives its document as it was put in", async () => {
    const answer = await call("manager", getDocument, `/api/parts/${part.id}/document?revision=1`, { params: { id: part.id } });
    expect(answer.body).toEqual(bracketDocument);
    expect((await call("manager", getDocument, `/api/parts/${part.id}/document?revision=9`, { params: { id: part.id } })).status).toBe(404);
  });
});

it("a part without a released sheet is deleted with its plans and drafts, and every change is on record", async () => {
  const made = (await call("engineer", createPart, "/api/parts", { body: { document: bracketDocument, number: "X-9" } })).body as unknown as PartDetail;
  expect((await call("engineer", deletePart, `/api/parts/${made.id}`, { params: { id: made.id } })).status).toBe(204);
  expect((await call("engineer", getPart, `/api/parts/${made.id}`, { params: { id: made.id } })).status).toBe(404);
  const said = (await database()("audit_events").orderBy("id").select<{ action: string; subject: string }[]>("action", "subject")).map(({ action, subject }) => `${action}: ${subject}`);
  expect(said).toEqual(expect.arrayContaining(["created a part: X-9 Bracket", "deleted a part: X-9 Bracket", `revised a part: ${part.number} rev 2 Bracket, wider`]));
  expect(said.filter((text) => text.startsWith("released a setup sheet"))).toHaveLength(3);
});
