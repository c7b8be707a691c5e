import { queryOptions, useQuery } from "@tanstack/react-query";
import type { PersonItem } from "@/lib/schemas/views";
import { request } from "./request";

export const peopleOptions = () =>
  queryOptions({
    queryKey: ["people"],
    queryFn: ({ signal }) => request<readonly PersonItem[]>("/api/people", { signal }),
  });

export const usePeople = () => useQuery(peopleOptions());
