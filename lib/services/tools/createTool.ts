import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { isTaken } from "../isTaken";
import { recordEvent } from "../recordEvent";
import { newPieces } from "./newPieces";
import { pieceCodeTaken } from "./pieceCodeTaken";
import { readToolEntry } from "./readToolEntry";
import { toolDetail } from "./toolDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { insertTool } from "@/db/tools/insertTool";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { toolSchema } from "@/lib/schemas/toolInputs";
import type { ToolDetail } from "@/lib/schemas/views";

/** A new tool with its pieces, all in the rack. */
export async function createTool(person: SignedInPerson, input: z.output<typeof toolSchema>): Promise<Result<ToolDetail, Failure>> {
  const { code, pieces, units, ...values } = input;
  const read = readToolEntry({ id: code, ...values }, units);
  if (!read.ok) return read;
  const db = database();
  try {
    await db.transaction(async (within) => {
      await insertTool(within, read.value, newPieces(code, pieces, units, []));
      await recordEvent(within, person, "added a tool", `${code} ${read.value.name}`, `${pieces.reduce((sum, piece) => sum + piece.count, 0)} pieces`);
    });
    return ok(foundAgain(await toolDetail(db, code)));
  } catch (thrown) {
    if (!isTaken(thrown, "tools_code_key")) return pieceCodeTaken(thrown);
    const message = `The code ${code} is another tool's already. Choose another.`;
    return fail({ kind: "conflict", message, errors: [{ path: "code", message }] });
  }
}
