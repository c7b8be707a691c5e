import { STATUS_CODES } from "node:http";
import type { FieldProblem } from "@/bending/core/problem";
import type { Problem } from "@/lib/schemas/problem";

export interface ProblemFacts {
  readonly status: number;
  readonly detail: string;
  readonly errors?: readonly FieldProblem[];
  readonly retryAfterSeconds?: number;
}

/** RFC 9457. The type is about:blank: the title is the status in words, `detail` and `errors` say the rest. */
export function problemResponse({ status, detail, errors, retryAfterSeconds }: ProblemFacts): Response {
  const problem: Problem = { type: "about:blank", title: STATUS_CODES[status] ?? "Problem", status, detail, ...(errors ? { errors } : {}) };
  const headers = new Headers({ "content-type": "application/problem+json", "cache-control": "no-store" });
  if (retryAfterSeconds !== undefined) headers.set("retry-after", String(Math.max(1, Math.ceil(retryAfterSeconds))));
  return new Response(JSON.stringify(problem), { status, headers });
}
