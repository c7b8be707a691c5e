import { isTaken } from "../isTaken";
import { fail, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";

/** The conflict that a piece's mark of another piece means; anything else is thrown on. */
export function pieceCodeTaken(thrown: unknown): Result<never, Failure> {
  if (!isTaken(thrown, "tool_pieces_code_key")) throw thrown;
  const detail = "detail" in (thrown as object) ? String((thrown as { detail: unknown }).detail) : "";
  const mark = /\(code\)=\((.*)\)/.exec(detail)?.[1];
  const message = `The mark ${mark ?? "of a piece"} stands on another piece already; each piece needs its own. Nothing was saved.`;
  return fail({ kind: "conflict", message, errors: [{ path: "pieces", message }] });
}
