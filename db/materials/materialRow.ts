import type { MaterialFacts } from "@/bending/handbook/material";

/** A material as it is now. */
export interface MaterialRow {
  readonly id: string;
  readonly facts: MaterialFacts;
  readonly version: number;
  readonly version_id: string;
  readonly withdrawn_at: Date | null;
  readonly withdrawn_by: string | null;
  /** When and by whom the version was made; null: by the installation, or by somebody who is no longer known. */
  readonly changed_at: Date;
  readonly changed_by: string | null;
}

export interface MaterialVersionRow {
  readonly id: string;
  readonly material_id: string;
  readonly version: number;
  readonly facts: MaterialFacts;
  readonly note: string;
  readonly created_at: Date;
  readonly created_by: string | null;
}
