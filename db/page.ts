/** One page of a list, as asked of the database. `sort` is a name from the list's own table of columns. */
export interface PageRequest<Sort extends string> {
  readonly q?: string | undefined;
  readonly sort: Sort;
  readonly dir: "asc" | "desc";
  readonly page: number;
  readonly pageSize: number;
}

export interface PageRows<Row> {
  readonly rows: readonly Row[];
  readonly total: number;
}
