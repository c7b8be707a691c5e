import { queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { ShopSettingsView, UpdateForceSettingsInput } from "@/lib/schemas/shopSettings";
import { request } from "./request";

export const shopSettingsOptions = () =>
  queryOptions({ queryKey: ["shop-settings"], queryFn: ({ signal }) => request<ShopSettingsView>("/api/shop-settings", { signal }), staleTime: 60_000 });

export const useShopSettings = () => useQuery(shopSettingsOptions());

export function useUpdateForceSettings() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: UpdateForceSettingsInput) => request<ShopSettingsView>("/api/shop-settings", { method: "PATCH", body: input }),
    onSuccess: () => client.invalidateQueries({ queryKey: ["shop-settings"] }),
  });
}
