import { queryOptions, useQuery } from "@tanstack/react-query";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import { request } from "./request";

export const shopLimitsOptions = () =>
  queryOptions({
    queryKey: ["shop-limits"],
    queryFn: ({ signal }) => request<ShopLimits>("/api/shop-limits", { signal }),
    staleTime: 60_000,
  });

/** What brakes and tools in service can do; not needed for a part to be drawn, so a screen goes on without it. */
export const useShopLimits = () => useQuery(shopLimitsOptions());
