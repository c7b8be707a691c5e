import { parentPort, workerData } from "node:worker_threads";
import { loadKernel } from "./loadKernel";
import { readStep } from "./readStep";
import type { StepAnswer, StepTask } from "./stepTask";
import { stepTextProblem } from "./stepTextProblem";

/** The reading thread: one file, then the end. What is wrong with the file at first sight is said before the kernel is loaded. */
const { bytes, body } = workerData as StepTask;
const say = (answer: StepAnswer) => parentPort?.postMessage(answer);

const early = stepTextProblem(bytes);
if (early) say({ ok: false, error: early });
else void loadKernel().then((loaded) => say(readStep(loaded, bytes, body ?? undefined)));
