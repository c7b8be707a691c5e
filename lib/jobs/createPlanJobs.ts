import { randomUUID } from "node:crypto";
import { PlanOverdue } from "./planOverdue";
import type { PlanRun, PlanRunner } from "./planRunner";
import type { PlanTask } from "./planTask";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanJobView } from "@/lib/schemas/views";

const BROKE_OFF = "Planning broke off. Nothing was stored; start it again. The server's log has the reason.";

export interface PlanJobFacts {
  /** Two jobs of one key at once are one job. */
  readonly key: string;
  readonly task: PlanTask;
  /** Stores the plan and answers its id. */
  readonly store: (plan: PlanDocument) => Promise<string>;
}

interface Job {
  readonly facts: PlanJobFacts | null;
  view: PlanJobView;
  run: PlanRun | null;
}
type Open = Job & { readonly facts: PlanJobFacts };

export interface PlanJobs {
  /** Starts it, or has it wait for its turn; null when too many wait already. */
  readonly start: (facts: PlanJobFacts) => PlanJobView | null;
  /** A job that is done before it began: the plan is there. */
  readonly finished: (planId: string) => PlanJobView;
  readonly find: (id: string) => PlanJobView | undefined;
  readonly cancel: (id: string) => PlanJobView | undefined;
}

export interface PlanJobLimits {
  readonly atOnce: number;
  readonly waitingMost: number;
  /** Jobs remembered after their end. */
  readonly rememberedMost: number;
}

/** The planning jobs of this process: so many at once, the rest in turn; the newest ended ones stay to be asked for. */
export function createPlanJobs(runner: PlanRunner, limits: PlanJobLimits): PlanJobs {
  const jobs = new Map<string, Job>();
  const waiting: Open[] = [];
  let underWay = 0;

  const change = (job: Job, view: Partial<PlanJobView>): void => {
    job.view = { ...job.view, ...view };
    if (job.view.state !== "running") forget(jobs, limits.rememberedMost);
  };
  const carryOut = async (job: Open): Promise<void> => {
    job.run = runner(job.facts.task, ({ fraction, message }) => change(job, { progress: fraction, message }));
    const plan = await job.run.result;
    job.run = null;
    if (job.view.state !== "running") return;
    change(job, { progress: 1, message: "Storing the plan" });
    change(job, { state: "done", message: endMessage(plan), planId: await job.facts.store(plan) });
  };
  const next = (): void => {
    while (underWay < limits.atOnce) {
      const job = waiting.shift();
      if (!job) return;
      underWay += 1;
      change(job, { message: "Planning" });
      void carryOut(job).catch((thrown: unknown) => failed(job, thrown)).finally(() => {
        underWay -= 1;
        next();
      });
    }
  };
  const failed = (job: Job, thrown: unknown): void => {
    job.run = null;
    if (job.view.state !== "running") return;
    console.error(`planning job ${job.view.id}:`, thrown);
    change(job, { state: "failed", message: thrown instanceof PlanOverdue ? thrown.message : BROKE_OFF });
  };

  return {
    start: (facts) => {
      const same = [...jobs.values()].find((job) => job.facts?.key === facts.key && job.view.state === "running");
      if (same) return same.view;
      if (waiting.length >= limits.waitingMost) return null;
      const job: Open = { facts, run: null, view: newView({ message: "Waiting for its turn" }) };
      jobs.set(job.view.id, job);
      waiting.push(job);
      next();
      return job.view;
    },
    finished: (planId) => {
      const view = newView({ state: "done", progress: 1, message: "This was planned before", planId });
      jobs.set(view.id, { facts: null, view, run: null });
      forget(jobs, limits.rememberedMost);
      return view;
    },
    find: (id) => jobs.get(id)?.view,
    cancel: (id) => {
      const job = jobs.get(id);
      const place = waiting.findIndex((entry) => entry === job);
      if (job?.view.state === "running" && (job.run || place >= 0)) {
        if (place >= 0) waiting.splice(place, 1);
        change(job, { state: "cancelled", message: "Cancelled" });
        job.run?.stop();
      }
      return job?.view;
    },
  };
}

const newView = (facts: Partial<PlanJobView>): PlanJobView => ({
  id: randomUUID(), state: "running", progress: null, message: "", planId: null, ...facts,
});

/** A map keeps the order in which jobs came: the oldest ended ones go first. */
function forget(jobs: Map<string, Job>, most: number): void {
  const ended = [...jobs.values()].filter((job) => job.view.state !== "running");
  for (const job of ended.slice(0, Math.max(0, ended.length - most))) jobs.delete(job.view.id);
}

function endMessage(plan: PlanDocument): string {
  switch (plan.status) {
    case "optimal": return "Done: least total time, proven";
    case "feasible": return "Done: it works; the search stopped before it was proven best";
    case "infeasible": return "Done: it cannot be made as it stands; the plan says why";
    case "unknown": return "Done: undecided in the time allowed";
    default: return plan.status satisfies never;
  }
}
