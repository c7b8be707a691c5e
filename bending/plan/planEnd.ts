/** What ended a search: `itself` (searching on would change nothing), its time limit, or a person who keeps the best so far. */
export type PlanEnd = "itself" | "limit" | "person";
