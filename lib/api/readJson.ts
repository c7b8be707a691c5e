import { fail, ok, type Result } from "@/bending/core/result";
import type { ProblemFacts } from "./problemResponse";
import { readBytes } from "./readBytes";

const megabytes = (bytes: number): string => `${Number((bytes / 1_000_000).toFixed(1))} MB`;

/** The body as JSON; never more than `limit` bytes are taken in, and nothing is parsed before the size is known. */
export async function readJson(request: Request, limit: number): Promise<Result<unknown, ProblemFacts>> {
  const kind = request.headers.get("content-type") ?? "";
  if (!/^application\/([\w.-]+\+)?json\b/i.test(kind)) return fail({ status: 415, detail: "Send the body as JSON, with the content type application/json." });
  const bytes = await readBytes(request, limit);
  if (bytes === null) return fail({ status: 413, detail: `The document is larger than ${megabytes(limit)}, which is the most that is read. Nothing was saved.` });
  try {
    return ok(JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes)));
  } catch {
    return fail({ status: 400, detail: "The body is not valid JSON in UTF-8. Nothing was saved." });
  }
}
