import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { AddTrialsInput, InstrumentInput, JudgeTrialInput, TrialListQuery, ValueListQuery } from "@/lib/schemas/bendTableInputs";
import type { AddedTrials, CoverageView, InstrumentView, TrialView, ValueDetail, ValueItem } from "@/lib/schemas/bendTableViews";
import type { CsvImportAnswer, CsvImportInput } from "@/lib/schemas/csvImport";
import type { Page } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

const root = "/api/bend-table";

export const useBendValues = (query: ValueListQuery = {}) => useQuery(queryOptions({
  queryKey: ["bend table", "values", query],
  queryFn: ({ signal }) => request<Page<ValueItem>>(`${root}${queryText(query)}`, { signal }),
  placeholderData: keepPreviousData,
}));

export const useBendValue = (key: string) => useQuery(queryOptions({
  queryKey: ["bend table", "value", key],
  queryFn: ({ signal }) => request<ValueDetail>(`${root}/values/${encodeURIComponent(key)}`, { signal }),
}));

export const useBendTrials = (query: TrialListQuery = {}) => useQuery(queryOptions({
  queryKey: ["bend table", "trials", query],
  queryFn: ({ signal }) => request<Page<TrialView>>(`${root}/trials${queryText(query)}`, { signal }),
  placeholderData: keepPreviousData,
}));

export const useBendCoverage = (material: string) => useQuery(queryOptions({
  queryKey: ["bend table", "coverage", material],
  queryFn: ({ signal }) => request<CoverageView>(`${root}/coverage${queryText({ material })}`, { signal }),
  enabled: material !== "",
  placeholderData: keepPreviousData,
}));

export const useInstruments = () => useQuery(queryOptions({
  queryKey: ["bend table", "instruments"],
  queryFn: ({ signal }) => request<readonly InstrumentView[]>(`${root}/instruments`, { signal }),
}));

export function useAddTrials() {
  const refresh = useRefreshBendTable();
  return useMutation({ mutationFn: (input: AddTrialsInput) => request<AddedTrials>(`${root}/trials`, { method: "POST", body: input }), onSuccess: refresh });
}

/** Whether one trial counts: `mutate({ id, state: "excluded", reason: "slipped" })`. */
export function useJudgeTrial() {
  const refresh = useRefreshBendTable();
  return useMutation({
    mutationFn: ({ id, ...judgement }: JudgeTrialInput & { readonly id: string }) => request<TrialView>(`${root}/trials/${encodeURIComponent(id)}`, { method: "PATCH", body: judgement }),
    onSuccess: refresh,
  });
}

export function useCreateInstrument() {
  const refresh = useRefreshBendTable();
  return useMutation({ mutationFn: (input: InstrumentInput) => request<InstrumentView>(`${root}/instruments`, { method: "POST", body: input }), onSuccess: refresh });
}

export function useWithdrawInstrument() {
  const refresh = useRefreshBendTable();
  return useMutation({
    mutationFn: ({ id, reason }: { readonly id: string; readonly reason: string }) => request<InstrumentView>(`${root}/instruments/${encodeURIComponent(id)}`, { method: "PATCH", body: { reason } }),
    onSuccess: refresh,
  });
}

export const importTrials = (input: CsvImportInput): Promise<CsvImportAnswer> => request<CsvImportAnswer>(`${root}/import`, { method: "POST", body: input });

/** For whatever changes what the bend table says; parts, plans and sheets say when their flats would come out differently. */
export function useRefreshBendTable() {
  const client = useQueryClient();
  return () => Promise.all(["bend table", "parts", "plans", "sheets"].map((key) => client.invalidateQueries({ queryKey: [key] })));
}
