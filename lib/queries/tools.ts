import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { AddPiecesInput, ToolInput, ToolListQuery, UpdatePieceInput, UpdateToolInput } from "@/lib/schemas/toolInputs";
import type { Page, PieceView, ToolDetail, ToolListItem } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

const toolPath = (code: string) => `/api/tools/${encodeURIComponent(code)}`;

export const toolListOptions = (query: ToolListQuery = {}) =>
  queryOptions({
    queryKey: ["tools", "list", query],
    queryFn: ({ signal }) => request<Page<ToolListItem>>(`/api/tools${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const toolOptions = (code: string) =>
  queryOptions({
    queryKey: ["tools", "one", code],
    queryFn: ({ signal }) => request<ToolDetail>(toolPath(code), { signal }),
  });

export const useToolList = (query: ToolListQuery = {}) => useQuery(toolListOptions(query));

export const useTool = (code: string) => useQuery(toolOptions(code));

export function useCreateTool() {
  const refresh = useRefreshTools();
  return useMutation({ mutationFn: (input: ToolInput) => request<ToolDetail>("/api/tools", { method: "POST", body: input }), onSuccess: refresh });
}

export function useUpdateTool(code: string) {
  const refresh = useRefreshTools();
  return useMutation({ mutationFn: (input: UpdateToolInput) => request<ToolDetail>(toolPath(code), { method: "PATCH", body: input }), onSuccess: refresh });
}

export function useAddPieces(code: string) {
  const refresh = useRefreshTools();
  return useMutation({
    mutationFn: (input: AddPiecesInput) => request<ToolDetail>(`${toolPath(code)}/pieces`, { method: "POST", body: input }),
    onSuccess: refresh,
  });
}

/** Changes one piece: `mutate({ id, state: "at regrind" })`. */
export function useUpdatePiece() {
  const refresh = useRefreshTools();
  return useMutation({
    mutationFn: ({ id, ...change }: UpdatePieceInput & { readonly id: string }) =>
      request<PieceView>(`/api/pieces/${encodeURIComponent(id)}`, { method: "PATCH", body: change }),
    onSuccess: refresh,
  });
}

function useRefreshTools() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: ["tools"] });
}
