import { Worker } from "node:worker_threads";
import { PlanOverdue } from "./planOverdue";
import type { JobAnswer } from "./jobAnswer";
import type { PlanRunner } from "./planRunner";
import type { PlanWorkerData, PlanWorkerMessage } from "./planWorkerMessage";

/** Longer than the search's own limit: what does not stop by itself is ended. */
const GRACE_MS = 30_000;

/** Plans in a thread of its own. The address of the worker must stand in the call itself: the bundler looks for it there. */
export const runInWorker: PlanRunner = (task, onProgress) => {
  const finish = new Int32Array(new SharedArrayBuffer(4));
  const workerData: PlanWorkerData = { task, finish };
  const worker = new Worker(new URL("./planWorker.ts", import.meta.url), { workerData });
  const result = new Promise<JobAnswer>((resolve, reject) => {
    const timer = setTimeout(() => {
      reject(new PlanOverdue((task.limitMs + GRACE_MS) / 1000));
      void worker.terminate();
    }, task.limitMs + GRACE_MS);
    worker.on("message", (message: PlanWorkerMessage) => {
      if (message.kind === "progress") onProgress(message.progress);
      else resolve(message.answer);
    });
    worker.on("error", reject);
    worker.on("exit", () => {
      clearTimeout(timer);
      reject(new Error("the planning thread ended without an answer"));
    });
  });
  return { result, stop: () => void worker.terminate(), finish: () => void Atomics.store(finish, 0, 1) };
};
