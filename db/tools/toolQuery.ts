import type { Knex } from "knex";
import type { Connection } from "../connection";
import { inService } from "./inService";

/** Tools joined with the count of their pieces. */
export const toolQuery = (db: Connection): Knex.QueryBuilder =>
  db("tools as tool").leftJoin(
    db("tool_pieces")
      .groupBy("tool_id")
      .select("tool_id", db.raw("count(*)::int as pieces"))
      .select(db.raw("(count(*) filter (where state = any(?)))::int as pieces_in_service", [[...inService]]))
      .select(db.raw("coalesce(sum(length_mm) filter (where state = any(?)), 0) as length_in_service_mm", [[...inService]]))
      .as("stock"),
    "stock.tool_id",
    "tool.id",
  );

export const toolColumnsCounted = (db: Connection): readonly (string | Knex.Raw)[] => [
  "tool.*",
  db.raw("coalesce(tool.tip_radius_mm, tool.shoulder_radius_mm) as radius_mm"),
  db.raw("coalesce(stock.pieces, 0) as pieces"),
  db.raw("coalesce(stock.pieces_in_service, 0) as pieces_in_service"),
  db.raw("coalesce(stock.length_in_service_mm, 0) as length_in_service_mm"),
];
