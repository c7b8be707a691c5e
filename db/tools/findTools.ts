import type { Knex } from "knex";
import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";
import { toolColumnsCounted, toolQuery } from "./toolQuery";
import type { ToolRow } from "./toolRow";

const columns = {
  code: "tool.code",
  name: "tool.name",
  kind: "tool.kind",
  angle: "tool.angle_deg",
  radius: "radius_mm",
  vOpening: "tool.v_opening_mm",
  height: "tool.height_mm",
  maxForce: "tool.max_force_kn_per_m",
  pieces: "pieces",
  lengthInService: "length_in_service_mm",
} as const;
export type ToolSort = keyof typeof columns;

export interface ToolFilter {
  readonly kind?: "punch" | "die" | undefined;
}

export async function findTools(db: Connection, request: PageRequest<ToolSort> & ToolFilter): Promise<PageRows<ToolRow>> {
  const filtered: Knex.QueryBuilder = toolQuery(db);
  if (request.kind) void filtered.where("tool.kind", request.kind);
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) =>
      any.whereILike("tool.code", pattern).orWhereILike("tool.name", pattern).orWhereILike("tool.tang", pattern));
  }
  return pageOf<ToolRow, ToolSort>(filtered, toolColumnsCounted(db), columns, request, "tool.id");
}
