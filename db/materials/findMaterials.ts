import type { MaterialFacts } from "@/bending/handbook/material";
import type { Connection } from "../connection";

export async function findMaterials(db: Connection): Promise<readonly MaterialFacts[]> {
  const rows = await db<{ id: string; facts: MaterialFacts }>("materials").select("facts").orderBy("id");
  return rows.map((row) => row.facts);
}
