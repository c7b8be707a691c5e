import type { Worker, WorkerOptions } from "node:worker_threads";
import { fail } from "@/bending/core/result";
import type { StepProblem } from "@/lib/schemas/stepReading";
import { STEP_LIMITS } from "./stepLimits";
import type { StepAnswer, StepTask } from "./stepTask";

export interface ReadInWorkerOptions {
  readonly start: (options: Required<Pick<WorkerOptions, "workerData" | "transferList" | "resourceLimits">>) => Worker;
  /** Ends the reading at once; the answer is then of no use to anyone. */
  readonly signal: AbortSignal;
  readonly milliseconds?: number;
  readonly heapMb?: number;
}

/** Reads a STEP file in a thread of its own, whose time and memory are bounded: a thread that goes over is ended, and the answer says which it was. */
export function readInWorker(task: StepTask, { start, signal, milliseconds = STEP_LIMITS.milliseconds, heapMb = STEP_LIMITS.heapMb }: ReadInWorkerOptions): Promise<StepAnswer> {
  const { bytes } = task;
  const own = bytes.byteLength === bytes.buffer.byteLength ? bytes : bytes.slice();
  return new Promise((resolve) => {
    const worker = start({ workerData: { ...task, bytes: own }, transferList: [own.buffer as ArrayBuffer], resourceLimits: { maxOldGenerationSizeMb: heapMb, stackSizeMb: STACK_MB } });
    const end = (answer: StepAnswer) => {
      clearTimeout(timer);
      signal.removeEventListener("abort", stop);
      resolve(answer);
      void worker.terminate();
    };
    const stop = () => end(fail(problem("too-long", "Reading was stopped.")));
    const timer = setTimeout(() => end(fail(problem("too-long", `The file could not be read within ${Math.round(milliseconds / 1000)} seconds and reading was ended. Export the one part alone, without threads and engraved text.`))), milliseconds);
    signal.addEventListener("abort", stop);
    if (signal.aborted) stop();
    worker.on("message", end);
    worker.on("error", (error: NodeJS.ErrnoException) => {
      if (error.code === "ERR_WORKER_OUT_OF_MEMORY") return end(fail(problem("too-much-memory", "Reading this file takes more memory than it may have. Export the one part alone, without threads, engraved text and its assembly.")));
      console.error("reading a STEP file:", error);
      return end(fail(problem("unreadable", "The file cannot be read: the geometry kernel gave up on it. Export or copy it again. The server's log has the reason.")));
    });
    worker.on("exit", () => end(fail(problem("unreadable", "The file cannot be read: the geometry kernel ended without an answer. Export or copy it again."))));
  });
}

const problem = (kind: StepProblem["kind"], message: string): StepProblem => ({ kind, message });

/** Deeply nested bodies recurse in the kernel. */
const STACK_MB = 16;
