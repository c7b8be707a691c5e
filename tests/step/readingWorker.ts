import { parentPort } from "node:worker_threads";
import { loadKernel } from "@/lib/step/loadKernel";
import { readStep } from "@/lib/step/readStep";

/** A thread that reads one file after another with one kernel, for as long as that holds. */
const loaded = await loadKernel();
parentPort?.on("message", (bytes: Uint8Array) => {
  const answer = readStep(loaded, bytes);
  const said = answer.ok ? { kind: answer.value.kind } : answer.error;
  parentPort?.postMessage({ ok: answer.ok, ...said, kernelBytes: loaded.kernel.wasmMemory.buffer.byteLength });
});
parentPort?.postMessage("ready");
