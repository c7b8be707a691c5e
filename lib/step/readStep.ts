import { recogniseSheet } from "@/bending/exchange/step/recogniseSheet";
import { fail, ok, type Result } from "@/bending/core/result";
import type { StepProblem, StepReading } from "@/lib/schemas/stepReading";
import type { LoadedKernel } from "./loadKernel";
import { readBody } from "./readBody";

/** A STEP file's bytes as a recognised part, or why not. `body` chooses one of several, from 1. In this thread, however long it takes. */
export function readStep({ kernel, ranOut }: LoadedKernel, bytes: Uint8Array, body?: number): Result<StepReading, StepProblem> {
  const read = readBody(kernel, bytes, body);
  if (!read.ok) {
    const { kind, message, bodies } = read.error;
    if (ranOut()) return fail(TOO_MUCH);
    return kind === "several-bodies" && bodies ? ok({ kind: "choose", message, bodies }) : read;
  }
  const part = recogniseSheet(read.value.solid);
  return part.ok ? ok({ kind: "part", part: part.value, mesh: read.value.mesh }) : fail({ kind: "not-sheet-metal", message: part.error });
}

const TOO_MUCH: StepProblem = { kind: "too-much-memory", message: "Reading this file takes more memory than it may have. Export the one part alone, without threads, engraved text and its assembly." };
