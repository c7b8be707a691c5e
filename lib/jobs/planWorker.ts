import { parentPort, workerData } from "node:worker_threads";
import type { PlanWorkerData, PlanWorkerMessage } from "./planWorkerMessage";
import { runJobTask } from "./runJobTask";

/** The planning thread: one task, then the end. An error thrown here reaches the thread that started it. */
const say = (message: PlanWorkerMessage) => parentPort?.postMessage(message);
const { task, finish } = workerData as PlanWorkerData;

say({ kind: "done", answer: runJobTask(task, { onProgress: (progress) => say({ kind: "progress", progress }), finishAsked: () => Atomics.load(finish, 0) === 1 }) });
