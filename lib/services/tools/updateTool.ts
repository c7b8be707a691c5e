import type { z } from "zod";
import { foundAgain } from "../foundAgain";
import { recordEvent } from "../recordEvent";
import { noSuchTool } from "./noSuchTool";
import { readToolEntry } from "./readToolEntry";
import { toolDetail } from "./toolDetail";
import { toolValuesIn } from "./toolValuesIn";
import { ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import { findTool } from "@/db/tools/findTool";
import { lockTool } from "@/db/tools/lockTool";
import { toolFromRow } from "@/db/tools/toolFromRow";
import { updateTool as updateToolRow } from "@/db/tools/updateTool";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { updateToolSchema } from "@/lib/schemas/toolInputs";
import type { ToolDetail } from "@/lib/schemas/views";

/** Changes the values given and keeps the rest; the whole tool is checked again. Kind, code and pieces stay. */
export async function updateTool(person: SignedInPerson, code: string, input: z.output<typeof updateToolSchema>): Promise<Result<ToolDetail, Failure>> {
  const db = database();
  const { units, ...values } = input;
  const changed = Object.entries(values).filter(([, value]) => value !== undefined);
  const result = await db.transaction(async (within): Promise<Result<null, Failure>> => {
    await lockTool(within, code);
    const row = await findTool(within, code);
    if (!row) return noSuchTool(code);
    const read = readToolEntry({ ...toolValuesIn(toolFromRow(row, []), units), ...Object.fromEntries(changed) }, units);
    if (!read.ok) return read;
    await updateToolRow(within, code, read.value);
    await recordEvent(within, person, "changed a tool", `${code} ${read.value.name}`, changed.map(([name]) => name).join(", "));
    return ok(null);
  });
  return result.ok ? ok(foundAgain(await toolDetail(db, code))) : result;
}
