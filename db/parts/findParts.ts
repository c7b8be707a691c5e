import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";

export interface PartListRow {
  readonly id: string;
  readonly number: string;
  readonly name: string;
  readonly material_id: string;
  readonly thickness_mm: number;
  readonly bends: number;
  readonly flat_width_mm: number;
  readonly flat_depth_mm: number;
  readonly revision: number;
  readonly released_sheets: number;
  readonly updated_at: Date;
  readonly updated_by: string | null;
}

const columns = {
  number: "part.number",
  name: "revision.name",
  material: "revision.material_id",
  thickness: "revision.thickness_mm",
  bends: "revision.bends",
  revision: "revision.revision",
  updatedAt: "part.updated_at",
} as const;
export type PartSort = keyof typeof columns;

export interface PartFilter {
  readonly material?: string | undefined;
}

/** Parts by their newest revision; `q` is looked for in number, name and material. */
export async function findParts(db: Connection, request: PageRequest<PartSort> & PartFilter): Promise<PageRows<PartListRow>> {
  const filtered = db("parts as part")
    .join("part_revisions as revision", (on) => on.on("revision.part_id", "part.id").andOn("revision.revision", "part.latest_revision"))
    .leftJoin("users as author", "author.id", "revision.created_by");
  if (request.material) void filtered.where("revision.material_id", request.material);
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) =>
      any.whereILike("part.number", pattern).orWhereILike("revision.name", pattern).orWhereILike("revision.material_id", pattern));
  }
  return pageOf<PartListRow, PartSort>(filtered, [
    "part.id", "part.number", "revision.name", "revision.material_id", "revision.thickness_mm", "revision.bends", "revision.flat_width_mm",
    "revision.flat_depth_mm", "revision.revision", "part.updated_at", "author.name as updated_by",
    db.raw("(select count(*)::int from sheets where sheets.part_id = part.id and sheets.state = 'released') as released_sheets"),
  ], columns, request, "part.id");
}
