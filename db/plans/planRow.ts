import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanOriginRow } from "./newPlan";

export interface PlanListRow {
  readonly id: string;
  readonly part_id: string;
  readonly part_number: string;
  readonly part_name: string;
  readonly revision: number;
  readonly machine_id: string;
  readonly machine_name: string;
  readonly status: PlanDocument["status"];
  readonly batch: number;
  readonly steps: number;
  readonly stations: number;
  readonly seconds_per_part: number;
  readonly setup_seconds: number;
  readonly origin: PlanOriginRow;
  readonly created_at: Date;
  readonly created_by: string | null;
}
