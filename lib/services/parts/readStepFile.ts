import { invalid } from "../invalid";
import { fail, ok, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import { readBytes } from "@/lib/api/readBytes";
import type { StepReading } from "@/lib/schemas/stepReading";
import { readInWorker } from "@/lib/step/readInWorker";
import { startStepWorker } from "@/lib/step/startStepWorker";
import { STEP_LIMITS } from "@/lib/step/stepLimits";
import { stepTurns } from "@/lib/step/stepTurns";

/** Reads the STEP file that a request carries. Nothing is stored; when the request is broken off, so is the reading. */
export async function readStepFile(request: Request, body: number | null): Promise<Result<StepReading, Failure>> {
  const turn = stepTurns()();
  if (turn === null) return fail({ kind: "busy", message: "Too many files are being read already. Try again in a minute.", retryAfterSeconds: 60 });
  const giveBack = await turn;
  try {
    const bytes = await readBytes(request, STEP_LIMITS.bytes);
    if (bytes === null) return fail(invalid(`The file is larger than ${STEP_LIMITS.bytes / 1e6} MB, which is the most that is read. Export the one part alone, without its assembly.`, []));
    const answer = await readInWorker({ bytes, body }, { start: startStepWorker, signal: request.signal });
    return answer.ok ? ok(answer.value) : fail(invalid(answer.error.message, []));
  } finally {
    giveBack();
  }
}
