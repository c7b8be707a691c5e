import { fail, ok, type Result } from "@/bending/core/result";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { loadKernel } from "./loadKernel";
import { readStep } from "./readStep";
import { stepTextProblem } from "./stepTextProblem";

/** A STEP file's part, read in this thread: for the command line, which has nothing else to do. `body` chooses one of several, from 1. */
export async function readSolidFile(bytes: Uint8Array, body?: number): Promise<Result<RecognisedPart, string>> {
  const early = stepTextProblem(bytes);
  if (early) return fail(early.message);
  const read = readStep(await loadKernel(), bytes, body);
  if (!read.ok) return fail(read.error.message);
  if (read.value.kind === "part") return ok(read.value.part);
  return fail(`${read.value.message} Give --body with its number: ${read.value.bodies.map(({ body: number, size }) => `${number} (${size.map((value) => Math.round(value)).join(" x ")} mm)`).join(", ")}`);
}
