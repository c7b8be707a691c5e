import type { Page } from "@/lib/schemas/views";

/** A page of rows as the API answers it. */
export const asPage = <Row, Item>(
  { rows, total }: { readonly rows: readonly Row[]; readonly total: number },
  { page, pageSize }: { readonly page: number; readonly pageSize: number },
  item: (row: Row) => Item,
): Page<Item> => ({ items: rows.map(item), total, page, pageSize });
