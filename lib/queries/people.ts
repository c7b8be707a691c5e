import { keepPreviousData, queryOptions, useQuery } from "@tanstack/react-query";
import type { ListQuery, Page, PersonItem } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

export const peopleOptions = (query: ListQuery = {}) =>
  queryOptions({
    queryKey: ["people", query],
    queryFn: ({ signal }) => request<Page<PersonItem>>(`/api/people${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const usePeople = (query: ListQuery = {}) => useQuery(peopleOptions(query));
