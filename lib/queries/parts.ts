import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { CreatePartInput, AddRevisionInput, PartListQuery } from "@/lib/schemas/partInputs";
import type { Page, PartDetail, PartListItem } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

export const partListOptions = (query: PartListQuery = {}) =>
  queryOptions({
    queryKey: ["parts", "list", query],
    queryFn: ({ signal }) => request<Page<PartListItem>>(`/api/parts${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const partOptions = (id: string, revision?: number) =>
  queryOptions({
    queryKey: ["parts", "one", id, revision ?? "newest"],
    queryFn: ({ signal }) => request<PartDetail>(`/api/parts/${encodeURIComponent(id)}${queryText({ revision })}`, { signal }),
  });

export const usePartList = (query: PartListQuery = {}) => useQuery(partListOptions(query));

export const usePart = (id: string, revision?: number) => useQuery(partOptions(id, revision));

export function useCreatePart() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: CreatePartInput) => request<PartDetail>("/api/parts", { method: "POST", body: input }),
    onSuccess: () => client.invalidateQueries({ queryKey: ["parts"] }),
  });
}

export function useAddRevision(partId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: AddRevisionInput) =>
      request<PartDetail>(`/api/parts/${encodeURIComponent(partId)}/revisions`, { method: "POST", body: input }),
    onSuccess: () => client.invalidateQueries({ queryKey: ["parts"] }),
  });
}

export function useDeletePart() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request<undefined>(`/api/parts/${encodeURIComponent(id)}`, { method: "DELETE" }),
    onSuccess: (_answer, id) => {
      client.removeQueries({ queryKey: ["parts", "one", id] });
      return client.invalidateQueries({ predicate: (query) => query.queryKey[0] !== "parts" || query.queryKey[2] !== id });
    },
  });
}
