import { keepPreviousData, queryOptions, useQuery } from "@tanstack/react-query";
import type { FindingCountsView } from "@/lib/schemas/findingCounts";
import { queryText } from "./queryText";
import { request } from "./request";

// Under "parts", so that a saved revision asks anew.
export const findingCountsOptions = (ids: readonly string[]) =>
  queryOptions({
    queryKey: ["parts", "findings", ids],
    queryFn: ({ signal }) => request<FindingCountsView>(`/api/finding-counts${queryText({ ids: ids.join(",") })}`, { signal }),
    enabled: ids.length > 0,
    placeholderData: keepPreviousData,
  });

export const useFindingCounts = (ids: readonly string[]) => useQuery(findingCountsOptions(ids));
