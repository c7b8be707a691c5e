import { queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { PlanJobListQuery } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

const POLL_MS = 500;

/** Asks again and again while the job runs. */
export const planJobOptions = (id: string | null) =>
  queryOptions({
    queryKey: ["plan-jobs", "one", id],
    queryFn: ({ signal }) => request<PlanJobView>(`/api/plan-jobs/${encodeURIComponent(id ?? "")}`, { signal }),
    enabled: id !== null,
    refetchInterval: (query) => (query.state.data === undefined || query.state.data.state === "running" ? POLL_MS : false),
  });

/** The jobs of a part or about a plan, newest first; asked again while one of them runs. */
export const planJobListOptions = (query: PlanJobListQuery) =>
  queryOptions({
    queryKey: ["plan-jobs", "list", query],
    queryFn: ({ signal }) => request<readonly PlanJobView[]>(`/api/plan-jobs${queryText(query)}`, { signal }),
    refetchInterval: (asked) => (asked.state.data?.some(({ state }) => state === "running") ? POLL_MS : false),
  });

/** Follows a planning job; null: none yet. When `data.state` is `done`, `data.planId` is the plan. */
export const usePlanJob = (id: string | null) => useQuery(planJobOptions(id));

export const usePlanJobList = (query: PlanJobListQuery) => useQuery(planJobListOptions(query));

/** Keeps a job that a mutation answered, and has the lists of jobs asked again. */
export function useKeepJob() {
  const client = useQueryClient();
  return (job: PlanJobView) => {
    client.setQueryData(planJobOptions(job.id).queryKey, job);
    return client.invalidateQueries({ queryKey: ["plan-jobs", "list"] });
  };
}

export function useCancelPlanJob() {
  const keep = useKeepJob();
  return useMutation({ mutationFn: (id: string) => request<PlanJobView>(`/api/plan-jobs/${encodeURIComponent(id)}`, { method: "DELETE" }), onSuccess: keep });
}

/** Has a job end with the best so far. */
export function useFinishPlanJob() {
  const keep = useKeepJob();
  return useMutation({ mutationFn: (id: string) => request<PlanJobView>(`/api/plan-jobs/${encodeURIComponent(id)}/finish`, { method: "POST" }), onSuccess: keep });
}
