import { parentPort, workerData } from "node:worker_threads";
import type { PlanTask } from "./planTask";
import type { PlanWorkerMessage } from "./planWorkerMessage";
import { runPlanTask } from "./runPlanTask";

/** The planning thread: one task, then the end. An error thrown here reaches the thread that started it. */
const say = (message: PlanWorkerMessage) => parentPort?.postMessage(message);

say({ kind: "done", plan: runPlanTask(workerData as PlanTask, (progress) => say({ kind: "progress", progress })) });
