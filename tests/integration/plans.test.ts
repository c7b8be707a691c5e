import { beforeAll, describe, expect, it } from "vitest";
import { POST as createPart } from "@/app/api/parts/route";
import { PATCH as updatePiece } from "@/app/api/pieces/[id]/route";
import { DELETE as cancelJob, GET as getJob } from "@/app/api/plan-jobs/[id]/route";
import { POST as finishJob } from "@/app/api/plan-jobs/[id]/finish/route";
import { GET as listJobs } from "@/app/api/plan-jobs/route";
import { POST as chooseAlternative } from "@/app/api/plans/[id]/alternatives/route";
import { POST as findChanges } from "@/app/api/plans/[id]/changes/route";
import { POST as checkPlan } from "@/app/api/plans/[id]/checks/route";
import { POST as moreTime } from "@/app/api/plans/[id]/more-time/route";
import { POST as ownOrder } from "@/app/api/plans/[id]/order/route";
import { POST as robustness } from "@/app/api/plans/[id]/robustness/route";
import { GET as getPlan } from "@/app/api/plans/[id]/route";
import { GET as getShop } from "@/app/api/plans/[id]/shop/route";
import { POST as startPlan } from "@/app/api/plans/route";
import { database } from "@/db/client";
import { findPieces } from "@/db/tools/findPieces";
import { createPlanJobs, type PlanJobs } from "@/lib/jobs/createPlanJobs";
import { runJobTask } from "@/lib/jobs/runJobTask";
import type { PlanDetail, PlanJobView, PlanShopView } from "@/lib/schemas/views";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";

const { call, machineId } = bracketCaller();
let partId = "";

/** The jobs of this process without threads of their own: the same work, done at once. */
beforeAll(async () => {
  const jobs = createPlanJobs((task) => ({
    result: Promise.resolve().then(() => runJobTask(task, { onProgress: () => undefined, finishAsked: () => false })), stop: () => undefined, finish: () => undefined,
  }), { atOnce: 1, quickAtOnce: 1, waitingMost: 5, rememberedMost: 50 });
  (globalThis as typeof globalThis & { foldwrightJobs?: PlanJobs }).foldwrightJobs = jobs;
  const zed = { ...bracketDocument, name: "Z", profile: { width: 150, legs: [40, 60, 40], bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "down" }] } };
  partId = (await call("engineer", createPart, "/api/parts", { body: { document: zed, note: "" } })).body["id"] as string;
});

async function ended(started: { readonly status: number; readonly body: object }): Promise<PlanJobView> {
  expect(started.status).toBe(202);
  for (let job = started.body as PlanJobView; ; job = (await call("engineer", getJob, `/api/plan-jobs/${job.id}`, { params: { id: job.id } })).body as unknown as PlanJobView) {
    if (job.state !== "running") return job;
    await new Promise((resolve) => setTimeout(resolve, 10));
  }
}
const start = (changes: object = {}) => call("engineer", startPlan, "/api/plans", { body: { partId, machineId: machineId(), batch: 20, ...changes } });
const on = (route: Parameters<typeof call>[1], id: string, path: string, body?: object) => call("engineer", route, `/api/plans/${id}/${path}`, { params: { id }, ...(body ? { body } : {}) });
const plan = async (id: string) => (await call("manager", getPlan, `/api/plans/${id}`, { params: { id } })).body as unknown as PlanDetail;
const planned = async (changes: object = {}) => plan((await ended(await start(changes))).planId ?? "");
const piece = async (change: object) => {
  const { id } = (await findPieces(database(), { toolCodes: ["V-16"] }))[0]!;
  return call("toolroom", updatePiece, `/api/pieces/${id}`, { params: { id }, body: change });
};

describe("the same question", () => {
  it("is planned once, whatever time is allowed; another batch, or more other plans, is another question", async () => {
    const first = await planned();
    expect(first).toMatchObject({ status: "optimal", origin: "planned", ended: "itself", limitSeconds: 60, fromPlanId: null, lastCheck: null });
    const again = await ended(await start({ limitSeconds: 5 }));
    expect([again.planId, again.message]).toEqual([first.id, "This was planned before"]);
    expect([(await planned({ batch: 21 })).id, (await planned({ alternatives: 0 })).id].includes(first.id)).toBe(false);
  });

  it("is another one when a piece leaves the shop, and the first again when it is back", async () => {
    const first = await planned();
    const shop = async () => (await on(getShop, first.id, "shop")).body as unknown as PlanShopView;
    expect(await shop()).toMatchObject({ asPlanned: true, task: { batch: 20, document: { name: "Z" } } });
    await piece({ state: "at regrind" });
    expect((await start()).status).toBe(202);
    await piece({ state: "in rack" });
    expect([(await shop()).asPlanned, (await planned()).id]).toEqual([true, first.id]);
  });
});

describe("a stored plan", () => {
  it("is looked over again: it holds, then not, with the piece named; both on record", async () => {
    const { id } = await planned();
    expect((await ended(await on(checkPlan, id, "checks"))).result).toMatchObject({ kind: "check", check: { holds: true, wrong: [], steps: 2 } });
    await piece({ state: "withdrawn" });
    const job = await ended(await on(checkPlan, id, "checks"));
    const { lastCheck } = await plan(id);
    await piece({ state: "in rack" });
    expect([job.message, job.fromPlanId]).toEqual(["Done: the plan does not hold any more", id]);
    expect(lastCheck).toMatchObject({ holds: false, checkedBy: "The engineer" });
    expect(lastCheck?.wrong.map(({ step, reason }) => [step, reason.message])).toContainEqual([null, expect.stringContaining("V-16-200-1 of V-16 cannot be used: withdrawn")]);
    expect((await ended(await on(checkPlan, id, "checks"))).result).toMatchObject({ check: { holds: true } });
    const said = await database()("audit_events").where({ action: "looked a plan over again" }).count({ n: "*" }).first();
    expect(Number((said as { n: string }).n)).toBe(3);
  });

  it("gives its other plans, and one of them can be made the plan, once", async () => {
    const detail = await planned({ alternatives: 2 });
    const { flat, order, steps } = detail.plan;
    const others = [{ ...detail.plan, alternatives: undefined, flat: undefined, elapsedMs: undefined, status: "feasible", order: [...order].reverse(), steps: [...steps].reverse() }];
    await database()("plans").where({ id: detail.id }).update({ document: JSON.stringify({ ...detail.plan, alternatives: others }) });
    const chosen = (await on(chooseAlternative, detail.id, "alternatives", { index: 0 })).body as unknown as PlanDetail;
    expect(chosen).toMatchObject({ origin: "chosen", status: "feasible", fromPlanId: detail.id, plan: { order: others[0]!.order, flat } });
    expect((await on(chooseAlternative, detail.id, "alternatives", { index: 0 })).body["id"]).toBe(chosen.id);
    const refused = await on(chooseAlternative, detail.id, "alternatives", { index: others.length });
    expect([refused.status, refused.body.errors?.[0]?.path]).toEqual([422, "index"]);
  });

  it("is not searched on when nothing would come of it", async () => {
    const { id } = await planned();
    const refused = await on(moreTime, id, "more-time", { moreSeconds: 60 });
    expect([refused.status, refused.body.detail]).toEqual([409, expect.stringContaining("ended by itself")]);
    expect((await on(findChanges, id, "changes", {})).status).toBe(409);
  });

  it("says how far the times may be off, and keeps it", async () => {
    const { id } = await planned();
    expect((await ended(await on(robustness, id, "robustness"))).result).toMatchObject({ kind: "firm" });
    expect((await plan(id)).plan.robustness?.settings.map(({ setting }) => setting)).toContain("flip");
  });
});

describe("a person's own order", () => {
  it("becomes a plan of its own that follows it, with what was asked of the bends", async () => {
    const detail = await planned();
    const order = [...detail.plan.order].reverse();
    const job = await ended(await on(ownOrder, detail.id, "order", { order }));
    const own = await plan(job.planId ?? "");
    expect([own.origin, own.fromPlanId, own.plan.order, own.batch]).toEqual(["own order", detail.id, order, 20]);
    expect((await ended(await on(ownOrder, detail.id, "order", { order }))).planId).toBe(own.id);
    const step = own.plan.steps[0]!;
    const wished = await plan((await ended(await on(ownOrder, detail.id, "order", { order, wishes: [{ bend: step.bends[0]!, front: step.front }] }))).planId ?? "");
    expect([wished.id === own.id, wished.plan.order, wished.plan.steps[0]?.front]).toEqual([false, order, step.front]);
  });

  it("that leaves a bend out is planned as impossible, and says so", async () => {
    const detail = await planned();
    const own = await plan((await ended(await on(ownOrder, detail.id, "order", { order: [detail.plan.order[0]!] }))).planId ?? "");
    expect([own.status, own.plan.reasons[0]?.message]).toEqual(["infeasible", expect.stringContaining("leaves out")]);
  });
});

it("jobs are listed by part and by plan, newest first; what has ended stays as it is", async () => {
  const detail = await planned();
  await ended(await on(checkPlan, detail.id, "checks"));
  const list = async (query: string) => (await call("manager", listJobs, `/api/plan-jobs?${query}`)).body as unknown as readonly PlanJobView[];
  const about = await list(`planId=${detail.id}`);
  expect(about[0]).toMatchObject({ kind: "check", state: "done", fromPlanId: detail.id, subject: expect.stringContaining("Test brake") });
  expect((await list(`partId=${partId}`)).length).toBeGreaterThan(about.length);
  expect(await list("partId=7")).toMatchObject({ status: 400 });
  const { id } = about[0]!;
  expect((await call("engineer", cancelJob, `/api/plan-jobs/${id}`, { params: { id } })).body).toMatchObject({ state: "done" });
  expect((await call("engineer", finishJob, `/api/plan-jobs/${id}/finish`, { params: { id } })).body).toMatchObject({ state: "done" });
  expect((await call("operator", listJobs, "/api/plan-jobs")).status).toBe(403);
});
