import type { Knex } from "knex";
import type { PageRequest, PageRows } from "./page";

/**
 * Counts what the filtered query finds and takes one page of it. The last order is `tieBreaker`, so that rows of the
 * same value never change places between two pages.
 */
export async function pageOf<Row extends object, Sort extends string>(
  filtered: Knex.QueryBuilder,
  select: readonly (string | Knex.Raw)[],
  columns: Readonly<Record<Sort, string>>,
  request: PageRequest<Sort>,
  tieBreaker: string,
): Promise<PageRows<Row>> {
  const counted: unknown = await filtered.clone().clearSelect().count({ total: "*" }).first();
  const rows: Row[] = await filtered
    .clone()
    .select([...select])
    .orderBy([{ column: columns[request.sort], order: request.dir, nulls: "last" }, { column: tieBreaker, order: "asc" }])
    .limit(request.pageSize)
    .offset((request.page - 1) * request.pageSize);
  return { rows, total: Number((counted as { total: string }).total) };
}
