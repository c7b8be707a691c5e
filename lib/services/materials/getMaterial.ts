import { materialDetail } from "./materialDetail";
import { fail, ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { MaterialDetail } from "@/lib/schemas/materialViews";

export async function getMaterial(id: string): Promise<Result<MaterialDetail, Failure>> {
  const found = await materialDetail(database(), id);
  return found ? ok(found) : fail({ kind: "not-found", message: `There is no material ${id}.` });
}
