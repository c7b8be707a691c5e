import { randomUUID } from "node:crypto";
import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import { PlanOverdue } from "./planOverdue";
import type { PlanRun, PlanRunner } from "./planRunner";
import type { PlanJobView } from "@/lib/schemas/planJobViews";

const BROKE_OFF = "It broke off and nothing was stored; start it again. The server's log has the reason.";

/** What a job is about, to find it again and to say so. */
export interface PlanJobPlace {
  readonly partId: string;
  /** The plan that it is about; null: the part is planned afresh. */
  readonly fromPlanId: string | null;
  /** "P-1001 rev 2 on Brake 1". */
  readonly subject: string;
  readonly by: string;
}

export interface PlanJobFacts {
  /** Two jobs of one key at once are one job. */
  readonly key: string;
  readonly place: PlanJobPlace;
  readonly task: JobTask;
  /** Stores what was found; answers how the job ends. */
  readonly store: (answer: JobAnswer) => Promise<Pick<PlanJobView, "message" | "planId" | "result">>;
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
  readonly finished: (planId: string, place: PlanJobPlace) => PlanJobView;
  readonly find: (id: string) => PlanJobView | undefined;
  /** The remembered ones, newest first. */
  readonly list: () => readonly PlanJobView[];
  readonly cancel: (id: string) => PlanJobView | undefined;
  /** Has a running one end with the best so far; one that waits or has ended stays as it is. */
  readonly finish: (id: string) => PlanJobView | undefined;
}

export interface PlanJobLimits {
  readonly atOnce: number;
  /** Of those that take a moment only, so that they do not wait behind a search. */
  readonly quickAtOnce: number;
  readonly waitingMost: number;
  /** Jobs remembered after their end. */
  readonly rememberedMost: number;
}

/** The planning jobs of this process: so many at once, the rest in turn; the newest ended ones stay to be asked for. */
export function createPlanJobs(runner: PlanRunner, limits: PlanJobLimits): PlanJobs {
  const jobs = new Map<string, Job>();
  const waiting: Open[] = [];
  const underWay = { search: 0, quick: 0 };

  const change = (job: Job, view: Partial<PlanJobView>): void => {
    job.view = { ...job.view, ...view };
    if (job.view.state !== "running") forget(jobs, limits.rememberedMost);
  };
  const carryOut = async (job: Open): Promise<void> => {
    job.run = runner(job.facts.task, ({ fraction, message }) => change(job, { progress: fraction, message }));
    const answer = await job.run.result;
    job.run = null;
    if (job.view.state !== "running") return;
    change(job, { progress: 1, message: "Storing what was found" });
    change(job, { ...(await job.facts.store(answer)), state: "done" });
  };
  const next = (): void => {
    const most = { search: limits.atOnce, quick: limits.quickAtOnce };
    for (;;) {
      const job = waiting.find(({ facts }) => underWay[laneOf(facts)] < most[laneOf(facts)]);
      if (!job) return;
      waiting.splice(waiting.indexOf(job), 1);
      const lane = laneOf(job.facts);
      underWay[lane] += 1;
      change(job, { message: "Under way" });
      void carryOut(job).catch((thrown: unknown) => failed(job, thrown)).finally(() => {
        underWay[lane] -= 1;
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
  const keep = <Kept extends Job>(job: Kept): Kept => {
    jobs.set(job.view.id, job);
    return job;
  };

  return {
    start: (facts) => {
      const same = [...jobs.values()].find((job) => job.facts?.key === facts.key && job.view.state === "running");
      if (same) return same.view;
      if (waiting.length >= limits.waitingMost) return null;
      const job = keep<Open>({ facts, run: null, view: { ...newView(facts.place), kind: facts.task.kind, message: "Waiting for its turn" } });
      waiting.push(job);
      next();
      return job.view;
    },
    finished: (planId, place) => {
      const job = keep({ facts: null, run: null, view: { ...newView(place), state: "done", progress: 1, message: "This was planned before", planId } });
      forget(jobs, limits.rememberedMost);
      return job.view;
    },
    find: (id) => jobs.get(id)?.view,
    list: () => [...jobs.values()].map(({ view }) => view).reverse(),
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
    finish: (id) => {
      const job = jobs.get(id);
      if (job?.view.state === "running") job.run?.finish();
      return job?.view;
    },
  };
}

/** Looking a plan over takes a moment; everything else searches. */
const laneOf = ({ task }: PlanJobFacts): "search" | "quick" => (task.kind === "check" ? "quick" : "search");

const newView = ({ partId, fromPlanId, subject, by }: PlanJobPlace): PlanJobView => ({
  id: randomUUID(), kind: "plan", subject, partId, fromPlanId, by, startedAt: new Date().toISOString(), state: "running", progress: null, message: "", planId: null, result: null,
});

/** A map keeps the order in which jobs came: the oldest ended ones go first. */
function forget(jobs: Map<string, Job>, most: number): void {
  const ended = [...jobs.values()].filter((job) => job.view.state !== "running");
  for (const job of ended.slice(0, Math.max(0, ended.length - most))) jobs.delete(job.view.id);
}
