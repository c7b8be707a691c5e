import { describe, expect, it } from "vitest";
import { emptyPlan } from "@/bending/plan/emptyPlan";
import { builtInMaterials } from "@/bending/handbook/materials";
import { createPlanJobs, type PlanJobFacts } from "./createPlanJobs";
import { PlanOverdue } from "./planOverdue";
import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import type { PlanRunner } from "./planRunner";

const task = { kind: "plan", limitMs: 1000, task: { material: builtInMaterials[0]!, tools: [], batch: 1, alternatives: 0, limitMs: 1000 } } as unknown as JobTask;
const plan = emptyPlan({ part: "a", machine: "b", units: "mm", batch: 1, status: "infeasible", method: "none", reasons: [] });
const answer: JobAnswer = { kind: "plan", plan, ended: "itself" };

/** A runner that is told from outside what its runs come to. */
function handRunner() {
  const runs: { say: (message: string, fraction: number) => void; end: (answer: JobAnswer) => void; stopped: boolean; finished: boolean }[] = [];
  const runner: PlanRunner = (_task, onProgress) => {
    let end: (answer: JobAnswer) => void = () => undefined;
    let fail: (error: Error) => void = () => undefined;
    const result = new Promise<JobAnswer>((resolve, reject) => {
      end = resolve;
      fail = reject;
    });
    const run = { say: (message: string, fraction: number) => onProgress({ expanded: 0, fraction, message }), end, stopped: false, finished: false };
    runs.push(run);
    return { result, stop: () => { run.stopped = true; fail(new Error("stopped")); }, finish: () => { run.finished = true; } };
  };
  return { runs, jobs: createPlanJobs(runner, { atOnce: 1, quickAtOnce: 1, waitingMost: 1, rememberedMost: 2 }) };
}
const place = { partId: "p", fromPlanId: null, subject: "P-1 rev 1 on Brake 1", by: "Ines" };
const stored = (key: string) => Promise.resolve({ planId: `plan of ${key}`, message: "Done", result: null });
const facts = (key: string, store: PlanJobFacts["store"] = () => stored(key)) => ({ key, place, task, store });
const settled = () => new Promise((resolve) => setImmediate(resolve));

describe("planning jobs", () => {
  it("run so many at once, the next in turn, and refuse what is too much", async () => {
    const { runs, jobs } = handRunner();
    const first = jobs.start(facts("a"));
    const second = jobs.start(facts("b"));
    expect([runs.length, second?.message, jobs.start(facts("c"))]).toEqual([1, "Waiting for its turn", null]);
    runs[0]?.say("12 orders looked at", 0.5);
    expect(jobs.find(first?.id ?? "")).toMatchObject({ state: "running", progress: 0.5, message: "12 orders looked at" });
    runs[0]?.end(answer);
    await settled();
    expect(jobs.find(first?.id ?? "")).toMatchObject({ state: "done", planId: "plan of a", progress: 1 });
    expect([runs.length, jobs.find(second?.id ?? "")?.message]).toEqual([2, "Under way"]);
  });

  it("are one job when the same is asked twice", () => {
    const { runs, jobs } = handRunner();
    expect(jobs.start(facts("a"))?.id).toBe(jobs.start(facts("a"))?.id);
    expect(runs.length).toBe(1);
  });

  it("are ended by being cancelled, running or waiting, and let the next one in", async () => {
    const { runs, jobs } = handRunner();
    const first = jobs.start(facts("a"));
    const second = jobs.start(facts("b"));
    expect(jobs.cancel(second?.id ?? "")).toMatchObject({ state: "cancelled", planId: null });
    expect(jobs.cancel(first?.id ?? "")?.state).toBe("cancelled");
    await settled();
    expect([runs[0]?.stopped, jobs.find(first?.id ?? "")?.state]).toEqual([true, "cancelled"]);
    jobs.start(facts("c"));
    expect(runs.length).toBe(2);
    expect(jobs.cancel("nothing")).toBeUndefined();
  });

  it("end with the best so far when asked to, once they run", async () => {
    const { runs, jobs } = handRunner();
    const first = jobs.start(facts("a"));
    const second = jobs.start(facts("b"));
    expect([jobs.finish(first?.id ?? "")?.state, jobs.finish(second?.id ?? "")?.state, jobs.finish("nothing")]).toEqual(["running", "running", undefined]);
    expect(runs.map(({ finished }) => finished)).toEqual([true]);
    runs[0]?.end(answer);
    await settled();
    expect(jobs.find(first?.id ?? "")).toMatchObject({ state: "done", planId: "plan of a" });
  });

  it("that take a moment only do not wait behind a search", () => {
    const { runs, jobs } = handRunner();
    jobs.start(facts("a"));
    jobs.start({ ...facts("b"), task: { ...task, kind: "check" } as unknown as JobTask });
    expect(runs.length).toBe(2);
  });

  it("are listed newest first with what they are about", () => {
    const { jobs } = handRunner();
    jobs.start(facts("a"));
    jobs.start({ ...facts("b"), place: { ...place, fromPlanId: "plan" } });
    expect(jobs.list().map(({ fromPlanId, subject, by, kind }) => [fromPlanId, subject, by, kind])).toEqual([["plan", place.subject, "Ines", "plan"], [null, place.subject, "Ines", "plan"]]);
  });

  it("fail when the plan cannot be stored, and stay so", async () => {
    const { runs, jobs } = handRunner();
    const job = jobs.start(facts("a", () => Promise.reject(new Error("the database is away"))));
    runs[0]?.end(answer);
    await settled();
    expect(jobs.find(job?.id ?? "")).toMatchObject({ state: "failed", planId: null });
    expect(jobs.cancel(job?.id ?? "")?.state).toBe("failed");
  });

  it("say when the planner came to no end", async () => {
    const jobs = createPlanJobs(() => ({ result: Promise.reject(new PlanOverdue(90)), stop: () => undefined, finish: () => undefined }), { atOnce: 1, quickAtOnce: 1, waitingMost: 1, rememberedMost: 2 });
    const job = jobs.start(facts("a"));
    await settled();
    expect(jobs.find(job?.id ?? "")).toMatchObject({ state: "failed", message: expect.stringContaining("within 90 seconds") });
  });

  it("are forgotten, the oldest ended ones first", () => {
    const { jobs } = handRunner();
    const ids = ["1", "2", "3"].map((planId) => jobs.finished(planId, place).id);
    expect(ids.map((id) => jobs.find(id)?.planId)).toEqual([undefined, "2", "3"]);
  });
});
