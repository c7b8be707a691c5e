import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { newPieces } from "./newPieces";
import { noSuchTool } from "./noSuchTool";
import { pieceCodeTaken } from "./pieceCodeTaken";
import { toolDetail } from "./toolDetail";
import { ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findPieces } from "@/db/tools/findPieces";
import { findTool } from "@/db/tools/findTool";
import { insertPieces } from "@/db/tools/insertPieces";
import { lockTool } from "@/db/tools/lockTool";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { addPiecesSchema } from "@/lib/schemas/toolInputs";
import type { ToolDetail } from "@/lib/schemas/views";

export async function addPieces(person: SignedInPerson, code: string, input: z.output<typeof addPiecesSchema>): Promise<Result<ToolDetail, Failure>> {
  const db = database();
  try {
    const found = await db.transaction(async (within) => {
      await lockTool(within, code);
      const tool = await findTool(within, code);
      if (!tool) return false;
      const existing = await findPieces(within, { toolCodes: [code] });
      const pieces = newPieces(code, input.pieces, input.units, existing.map((piece) => piece.code));
      await insertPieces(within, tool.id, pieces);
      await recordEvent(within, person, "added pieces", code, pieces.map((piece) => piece.code).join(", "));
      return true;
    });
    return found ? ok(foundAgain(await toolDetail(db, code))) : noSuchTool(code);
  } catch (thrown) {
    return pieceCodeTaken(thrown);
  }
}
