import { keepPreviousData, queryOptions, useQuery } from "@tanstack/react-query";
import type { ActivityItem, ListQuery, Page } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

export const activityOptions = (query: ListQuery = {}) =>
  queryOptions({
    queryKey: ["activity", query],
    queryFn: ({ signal }) => request<Page<ActivityItem>>(`/api/activity${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const useActivity = (query: ListQuery = {}) => useQuery(activityOptions(query));
