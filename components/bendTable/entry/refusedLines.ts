import type { FieldProblem } from "@/bending/core/problem";
import { fieldWords } from "./fieldWords";
import type { LineProblems } from "./readTrialLine";
import { lineFields } from "./trialDraft";

/** What the server said, by the id of the line (`sent` in the order in which they were sent) and the field. */
export function refusedLines(errors: readonly FieldProblem[], sent: readonly string[]): ReadonlyMap<string, LineProblems> {
  const found = new Map<string, LineProblems>();
  for (const { path, message } of errors) {
    const [, index, name] = /^lines\[(\d+)\]\.(\w+)$/.exec(path) ?? [];
    const line = index === undefined ? undefined : sent[Number(index)];
    const field = lineFields.find((one) => one === name) ?? "material";
    if (line !== undefined) found.set(line, { ...found.get(line), [field]: field === name ? `${fieldWords[field]} ${message}.` : `${name ?? path} ${message}.` });
  }
  return found;
}
