import { Worker, type WorkerOptions } from "node:worker_threads";

/** Starts the reading thread. The address of the worker must stand in the call itself, with options written out: the bundler looks for it there. */
export const startStepWorker = ({ workerData, transferList, resourceLimits }: Required<Pick<WorkerOptions, "workerData" | "transferList" | "resourceLimits">>): Worker =>
  new Worker(new URL("./stepWorker.ts", import.meta.url), { workerData, transferList, resourceLimits });
