import { queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { CsvImportAnswer, CsvImportInput } from "@/lib/schemas/csvImport";
import type { CreateMaterialInput, UpdateMaterialInput, WithdrawMaterialInput } from "@/lib/schemas/materialInputs";
import type { MaterialDetail, MaterialView } from "@/lib/schemas/materialViews";
import { request } from "./request";

const materialPath = (id: string) => `/api/materials/${encodeURIComponent(id)}`;

export const materialsOptions = () =>
  queryOptions({
    queryKey: ["materials"],
    queryFn: ({ signal }) => request<readonly MaterialView[]>("/api/materials", { signal }),
    staleTime: 60_000,
  });

export const useMaterials = () => useQuery(materialsOptions());

export const useMaterial = (id: string) =>
  useQuery({ queryKey: ["materials", "one", id], queryFn: ({ signal }) => request<MaterialDetail>(materialPath(id), { signal }) });

export function useCreateMaterial() {
  const refresh = useRefreshMaterials();
  return useMutation({ mutationFn: (input: CreateMaterialInput) => request<MaterialDetail>("/api/materials", { method: "POST", body: input }), onSuccess: refresh });
}

export function useUpdateMaterial(id: string) {
  const refresh = useRefreshMaterials();
  return useMutation({ mutationFn: (input: UpdateMaterialInput) => request<MaterialDetail>(materialPath(id), { method: "PATCH", body: input }), onSuccess: refresh });
}

export function useWithdrawMaterial(id: string) {
  const refresh = useRefreshMaterials();
  return useMutation({ mutationFn: (input: WithdrawMaterialInput) => request<MaterialDetail>(`${materialPath(id)}/withdrawal`, { method: "POST", body: input }), onSuccess: refresh });
}

export function useImportMaterials() {
  const refresh = useRefreshMaterials();
  return useMutation({
    mutationFn: (input: CsvImportInput) => request<CsvImportAnswer>("/api/materials-table", { method: "POST", body: input }),
    onSuccess: (answer) => (answer.written ? refresh() : undefined),
  });
}

/** Where the browser loads the table from. */
export const materialsTablePath = (separator: "comma" | "semicolon") => `/api/materials-table?separator=${separator}`;

/** Flats follow from materials: parts, plans and sheets say when theirs would come out differently. */
function useRefreshMaterials() {
  const client = useQueryClient();
  return () => Promise.all(["materials", "parts", "plans", "sheets", "bend table"].map((key) => client.invalidateQueries({ queryKey: [key] })));
}
