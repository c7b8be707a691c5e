import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { SheetListQuery } from "@/lib/schemas/sheetInputs";
import type { Page, SheetDetail, SheetListItem } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

export const sheetListOptions = (query: SheetListQuery = {}) =>
  queryOptions({
    queryKey: ["sheets", "list", query],
    queryFn: ({ signal }) => request<Page<SheetListItem>>(`/api/sheets${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const sheetOptions = (id: string) =>
  queryOptions({
    queryKey: ["sheets", "one", id],
    queryFn: ({ signal }) => request<SheetDetail>(`/api/sheets/${encodeURIComponent(id)}`, { signal }),
  });

export const useSheetList = (query: SheetListQuery = {}) => useQuery(sheetListOptions(query));

export const useSheet = (id: string) => useQuery(sheetOptions(id));

const WATCH_MS = 20_000;

/** A sheet that stays open for hours: asked for again and again, since it may be superseded meanwhile. */
export const useWatchedSheet = (id: string) => useQuery({ ...sheetOptions(id), refetchInterval: WATCH_MS, refetchOnWindowFocus: true });

/** Makes a draft of a plan's setup sheet. */
export function useCreateSheet() {
  const refresh = useRefreshSheets();
  return useMutation({
    mutationFn: (planId: string) => request<SheetDetail>(`/api/plans/${encodeURIComponent(planId)}/sheets`, { method: "POST", body: {} }),
    onSuccess: refresh,
  });
}

export function useReleaseSheet() {
  const refresh = useRefreshSheets();
  return useMutation({
    mutationFn: (id: string) => request<SheetDetail>(`/api/sheets/${encodeURIComponent(id)}/release`, { method: "POST", body: {} }),
    onSuccess: refresh,
  });
}

/** A sheet shows in lists of plans and counts of parts as well. */
function useRefreshSheets() {
  const client = useQueryClient();
  return () => Promise.all(["sheets", "plans", "parts"].map((key) => client.invalidateQueries({ queryKey: [key] })));
}
