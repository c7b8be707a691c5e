import { invalid } from "../invalid";
import type { Connection } from "@/db/connection";
import { findMaterial } from "@/db/materials/findMaterial";
import type { Failure } from "@/lib/api/failure";

/** Why a part may not newly be made of a material: it is withdrawn. A part that is of it already may stay so. */
export async function withdrawnProblem(db: Connection, id: string): Promise<Failure | null> {
  const material = await findMaterial(db, id);
  if (!material?.withdrawn_at) return null;
  return invalid("The part cannot be made as described. Nothing was saved.", [{ path: "material", message: `${id} is withdrawn and not for new parts; choose another, or have an engineer bring it back` }], "document");
}
