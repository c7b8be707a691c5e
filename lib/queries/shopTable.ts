import { queryOptions, useQuery } from "@tanstack/react-query";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { queryText } from "./queryText";
import { request } from "./request";

export const shopTableOptions = (material: string) =>
  queryOptions({
    queryKey: ["bend table", "as computed with", material],
    queryFn: ({ signal }) => request<ShopTable>(`/api/shop-table${queryText({ material })}`, { signal }),
    staleTime: 60_000,
    enabled: material !== "",
  });

/** The shop's measured values of a material; what is computed meanwhile goes by the handbook. */
export const useShopTable = (material: string) => useQuery(shopTableOptions(material));
