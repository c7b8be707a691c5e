import type { Connection } from "../connection";

export interface MaterialUses {
  /** Parts whose newest revision is of it. */
  readonly parts: number;
  /** By the id of the version. */
  readonly plansByVersion: Readonly<Record<string, number>>;
}

export async function countMaterialUses(db: Connection, id: string): Promise<MaterialUses> {
  const counted = await db("parts as part")
    .join("part_revisions as revision", (join) => { join.on("revision.part_id", "part.id").andOn("revision.revision", "part.latest_revision"); })
    .where("revision.material_id", id).count<{ parts: string }[]>({ parts: "*" });
  const plans = await db("plans as plan").join("material_versions as made", "made.id", "plan.material_version_id")
    .where("made.material_id", id).groupBy("made.id").select<{ id: string; plans: string }[]>(["made.id", db.raw("count(*) as plans")]);
  return { parts: Number(counted[0]?.parts ?? 0), plansByVersion: Object.fromEntries(plans.map((row) => [row.id, Number(row.plans)])) };
}
