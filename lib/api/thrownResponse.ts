import { isConnectionLost } from "@/db/isConnectionLost";
import { problemResponse } from "./problemResponse";

const sqlState = (thrown: unknown): string | undefined =>
  thrown instanceof Error && "code" in thrown && typeof thrown.code === "string" ? thrown.code : undefined;

/** What was thrown goes into the server's log; whoever asked learns what it means for them, and no internals. */
export function thrownResponse(thrown: unknown, where: string): Response {
  if (isConnectionLost(thrown)) {
    console.error(`${where}: database connection lost`, thrown instanceof Error ? thrown.message : thrown);
    return problemResponse({ status: 503, detail: "The database cannot be reached just now. Nothing was half saved; try again in a minute.", retryAfterSeconds: 30 });
  }
  switch (sqlState(thrown)) {
    case "23505":
      return problemResponse({ status: 409, detail: "Something with this name or number exists already. Nothing was saved." });
    case "23503":
      return problemResponse({ status: 409, detail: "This refers to something that is gone, or is still used by something else. Nothing was saved." });
    case "40001":
    case "40P01":
      return problemResponse({ status: 409, detail: "Someone else changed this at the same moment. Nothing was saved; try again." });
    default:
      console.error(`${where}:`, thrown);
      return problemResponse({ status: 500, detail: "Something went wrong on the server. Nothing was half saved; the server's log has the reason." });
  }
}
