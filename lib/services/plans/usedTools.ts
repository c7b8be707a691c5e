import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";

/** The tools that a plan or one of its alternatives stands on. */
export function usedTools(plan: PlanDocument, tools: readonly Tool[]): readonly Tool[] {
  const used = new Set([plan, ...(plan.alternatives ?? [])].flatMap(({ steps, stations }) => [...steps, ...stations].flatMap(({ punch, die }) => [punch, die])));
  return tools.filter((tool) => used.has(tool.id));
}
