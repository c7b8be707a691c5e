import { keepPreviousData, queryOptions, useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { FindChangesInput, OwnOrderInput, PlanListQuery, StartPlanInput } from "@/lib/schemas/planInputs";
import type { Page, PlanDetail, PlanJobView, PlanListItem, PlanShopView } from "@/lib/schemas/views";
import { useKeepJob } from "./planJobs";
import { queryText } from "./queryText";
import { request } from "./request";

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

export const usePlanList = (query: PlanListQuery = {}) => useQuery(planListOptions(query));

export const usePlan = (id: string) => useQuery(planOptions(id));

/** What the plan's question stands on today; asked for when an order of one's own is begun. */
export const usePlanShop = (id: string) =>
  useQuery({
    queryKey: ["plans", "shop", id],
    queryFn: ({ signal }) => request<PlanShopView>(`/api/plans/${encodeURIComponent(id)}/shop`, { signal }),
    refetchOnWindowFocus: false,
  });

/** Posts what starts a job; the job is answered at once, and may be done already when the same was planned before. */
function useJobStarter<Input>(start: (input: Input) => Promise<PlanJobView>) {
  const client = useQueryClient();
  const keep = useKeepJob();
  return useMutation({
    mutationFn: start,
    onSuccess: async (job) => {
      await keep(job);
      await client.invalidateQueries({ queryKey: ["plans", "list"] });
    },
  });
}

const of = (id: string, what: string) => `/api/plans/${encodeURIComponent(id)}/${what}`;

export const useStartPlan = () => useJobStarter((input: StartPlanInput) => request<PlanJobView>("/api/plans", { method: "POST", body: input }));

/** Plans an order of one's own for what the plan is about. */
export const usePlanOwnOrder = (planId: string) => useJobStarter((input: OwnOrderInput) => request<PlanJobView>(of(planId, "order"), { method: "POST", body: input }));

/** Goes through the stored plan with today's shop. */
export const useCheckPlan = (planId: string) => useJobStarter(() => request<PlanJobView>(of(planId, "checks"), { method: "POST" }));

/** Searches on with so many seconds more. */
export const useSearchOn = (planId: string) => useJobStarter((moreSeconds: number) => request<PlanJobView>(of(planId, "more-time"), { method: "POST", body: { moreSeconds } }));

/** Looks for what would make the plan, or an order of one's own, work. */
export const useFindChanges = (planId: string) => useJobStarter((input: FindChangesInput) => request<PlanJobView>(of(planId, "changes"), { method: "POST", body: input }));

/** Looks how far the time settings may be off. */
export const useFindRobustness = (planId: string) => useJobStarter(() => request<PlanJobView>(of(planId, "robustness"), { method: "POST" }));

/** Makes one of the other plans a plan of its own. */
export function useChooseAlternative(planId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (index: number) => request<PlanDetail>(of(planId, "alternatives"), { method: "POST", body: { index } }),
    onSuccess: (plan) => {
      client.setQueryData(planOptions(plan.id).queryKey, plan);
      return client.invalidateQueries({ queryKey: ["plans", "list"] });
    },
  });
}
