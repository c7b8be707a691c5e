import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { pieceView } from "./pieceView";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findMachine } from "@/db/machines/findMachine";
import { findPieces } from "@/db/tools/findPieces";
import { updatePiece as updatePieceRow } from "@/db/tools/updatePiece";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { updatePieceSchema } from "@/lib/schemas/toolInputs";
import type { PieceView } from "@/lib/schemas/views";

export async function updatePiece(person: SignedInPerson, id: string, change: z.output<typeof updatePieceSchema>): Promise<Result<PieceView, Failure>> {
  const db = database();
  return db.transaction(async (within): Promise<Result<PieceView, Failure>> => {
    if (change.machineId !== undefined && !(await findMachine(within, change.machineId))) {
      return fail({ kind: "invalid", message: "There is no such machine. Nothing was saved.", errors: [{ path: "machineId", message: "must be one of the shop's machines" }] });
    }
    if (!(await updatePieceRow(within, id, change))) return fail({ kind: "not-found", message: "There is no such piece." });
    const [row] = await findPieces(within, { ids: [id] });
    const piece = foundAgain(row);
    await recordEvent(within, person, "changed a piece", piece.code, said(pieceView(piece)));
    return ok(pieceView(piece));
  });
}

const said = (piece: PieceView): string =>
  [`${piece.state}${piece.machine === null ? "" : ` (${piece.machine})`}`, `rack ${piece.rack === "" ? "not given" : piece.rack}`, `${piece.lengthMm} mm`].join(", ");
