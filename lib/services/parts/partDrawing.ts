import { getPart } from "./getPart";
import { shopOf } from "./shopOf";
import { fail, ok, type Result } from "@/bending/core/result";
import { drawPart, type DrawnFile } from "@/bending/exchange/drawPart";
import { buildPart } from "@/bending/part/buildPart";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import { partFileName } from "@/lib/format/partFileName";
import type { DrawingQuery } from "@/lib/schemas/partInputs";

/** A revision of a part as a file for other programs, unfolded with the shop's own values. */
export async function partDrawing(person: SignedInPerson, id: string, { format, revision, ticks, number: numbered }: DrawingQuery): Promise<Result<DrawnFile & { readonly name: string }, Failure>> {
  const found = await getPart(person, id, revision);
  if (!found.ok) return found;
  const { number, document, revision: shown } = found.value;
  const { materials, table } = await shopOf(database(), document);
  const built = buildPart(document, { materials, shopTable: table });
  if (!built.ok) return fail({ kind: "conflict", message: `This revision cannot be built any more, so there is nothing to draw: ${built.error[0]?.message ?? ""}` });
  const marks = { bendTicks: ticks === "yes", text: numbered === "yes" ? `${number} rev ${shown.revision}` : null };
  return ok({ ...drawPart(built.value, format, document.units, marks), name: partFileName(number, shown.revision, format) });
}
