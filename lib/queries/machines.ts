import { queryOptions, useQuery } from "@tanstack/react-query";
import type { MachineView } from "@/lib/schemas/views";
import { request } from "./request";

export const machinesOptions = () =>
  queryOptions({
    queryKey: ["machines"],
    queryFn: ({ signal }) => request<readonly MachineView[]>("/api/machines", { signal }),
    staleTime: 60_000,
  });

export const useMachines = () => useQuery(machinesOptions());
