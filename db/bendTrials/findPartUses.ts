import type { Connection } from "../connection";

export interface PartUseRow {
  readonly id: string;
  readonly number: string;
  readonly name: string;
  readonly material_id: string;
  readonly thickness_mm: number;
  readonly bends: number;
}

/** Parts, by their newest revision, that are made of a material (or of any) and have bends. */
export async function findPartUses(db: Connection, material?: string): Promise<readonly PartUseRow[]> {
  const query = db("parts as part")
    .join("part_revisions as revision", (on) => on.on("revision.part_id", "part.id").andOn("revision.revision", "part.latest_revision"))
    .where("revision.bends", ">", 0);
  if (material !== undefined) void query.where("revision.material_id", material);
  return query.select<PartUseRow[]>("part.id", "part.number", "revision.name", "revision.material_id", "revision.thickness_mm", "revision.bends").orderBy("part.number");
}
