import type { FieldProblem } from "@/bending/core/problem";
import type { PartDraft } from "../draft/partDraft";

const sentence = (message: string): string => {
  const text = message.charAt(0).toUpperCase() + message.slice(1);
  return /[.!?]$/.test(text) ? text : `${text}.`;
};

/** Finds what is wrong at a path. A rectangle has no corners to show, so its outline's problems go to its size. */
export function problemFinder(problems: readonly FieldProblem[], draft: PartDraft): (path: string) => string | undefined {
  const found = new Map<string, string>();
  for (const { path, message } of problems) {
    const shown = draft.base.kind === "rectangle" && path.startsWith("base.outline") ? (path.endsWith("[1]") ? "base.depth" : "base.width") : path;
    if (!found.has(shown)) found.set(shown, sentence(message));
  }
  return (path) => found.get(path);
}
