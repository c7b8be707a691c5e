import { queryOptions, useQuery } from "@tanstack/react-query";
import type { MaterialView } from "@/lib/schemas/views";
import { request } from "./request";

export const materialsOptions = () =>
  queryOptions({
    queryKey: ["materials"],
    queryFn: ({ signal }) => request<readonly MaterialView[]>("/api/materials", { signal }),
    staleTime: 60_000,
  });

export const useMaterials = () => useQuery(materialsOptions());
