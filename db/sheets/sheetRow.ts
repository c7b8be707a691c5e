export type SheetRowState = "draft" | "released" | "superseded";

export interface SheetListRow {
  readonly id: string;
  readonly number: string;
  readonly state: SheetRowState;
  readonly part_number: string;
  readonly part_name: string;
  readonly revision: number;
  readonly machine_id: string;
  readonly machine_name: string;
  readonly bends: number;
  readonly batch: number;
  readonly plan_id: string;
  readonly part_id: string;
  readonly released_at: Date | null;
  readonly released_by: string | null;
  readonly created_at: Date;
}
