import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { PlanListQuery, StartPlanInput } from "@/lib/schemas/planInputs";
import type { Page, PlanDetail, PlanJobView, PlanListItem } from "@/lib/schemas/views";
import { queryText } from "./queryText";
import { request } from "./request";

const POLL_MS = 500;

export const planListOptions = (query: PlanListQuery = {}) =>
  queryOptions({
    queryKey: ["plans", "list", query],
    queryFn: ({ signal }) => request<Page<PlanListItem>>(`/api/plans${queryText(query)}`, { signal }),
    placeholderData: keepPreviousData,
  });

export const planOptions = (id: string) =>
  queryOptions({
    queryKey: ["plans", "one", id],
    queryFn: ({ signal }) => request<PlanDetail>(`/api/plans/${encodeURIComponent(id)}`, { signal }),
  });

/** Asks again and again while the job runs. */
export const planJobOptions = (id: string | null) =>
  queryOptions({
    queryKey: ["plan-jobs", id],
    queryFn: ({ signal }) => request<PlanJobView>(`/api/plan-jobs/${encodeURIComponent(id ?? "")}`, { signal }),
    enabled: id !== null,
    refetchInterval: (query) => (query.state.data === undefined || query.state.data.state === "running" ? POLL_MS : false),
  });

export const usePlanList = (query: PlanListQuery = {}) => useQuery(planListOptions(query));

export const usePlan = (id: string) => useQuery(planOptions(id));

/** Follows a planning job; null: none yet. When `data.state` is `done`, `data.planId` is the plan. */
export const usePlanJob = (id: string | null) => useQuery(planJobOptions(id));

/** Answers the job at once; it may be done already when the same was planned before. */
export function useStartPlan() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: StartPlanInput) => request<PlanJobView>("/api/plans", { method: "POST", body: input }),
    onSuccess: (job) => {
      client.setQueryData(planJobOptions(job.id).queryKey, job);
      return client.invalidateQueries({ queryKey: ["plans", "list"] });
    },
  });
}

export function useCancelPlanJob() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request<PlanJobView>(`/api/plan-jobs/${encodeURIComponent(id)}`, { method: "DELETE" }),
    onSuccess: (job) => {
      client.setQueryData(planJobOptions(job.id).queryKey, job);
    },
  });
}
