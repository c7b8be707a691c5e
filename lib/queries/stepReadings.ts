import { useMutation } from "@tanstack/react-query";
import type { StepReading } from "@/lib/schemas/stepReading";
import { queryText } from "./queryText";
import { request } from "./request";

export interface ReadStepInput {
  readonly file: File;
  /** Which body of several, from 1. */
  readonly body?: number;
  /** Breaks the reading off. */
  readonly signal: AbortSignal;
}

/** Has the server read a STEP file; nothing is stored. */
export function useReadStep() {
  return useMutation({
    mutationFn: ({ file, body, signal }: ReadStepInput) => request<StepReading>(`/api/step-readings${queryText({ body })}`, { method: "POST", file, signal }),
    networkMode: "always",
  });
}
