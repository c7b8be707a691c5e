import { createHash } from "node:crypto";
import type { PlanTask } from "@/lib/jobs/planTask";

/**
 * SHA-256 over everything that a plan follows from, keys in order. Two things are left out: where a piece is kept changes no plan, and
 * how long may be searched does not change what is proven (see `findSamePlan`).
 */
export function inputsDigest(engine: string, task: PlanTask): string {
  const tools = task.tools.map((tool) => ({ ...tool, pieces: tool.pieces.map(({ id, length, horn }) => ({ id, length, horn })) }));
  return createHash("sha256").update(canonical({ engine, ...task, tools, limitMs: undefined })).digest("hex");
}

const canonical = (value: unknown): string =>
  JSON.stringify(value, (_key, entry: unknown) =>
    typeof entry === "object" && entry !== null && !Array.isArray(entry)
      ? Object.fromEntries(Object.entries(entry).sort(([a], [b]) => (a < b ? -1 : 1)))
      : entry);
