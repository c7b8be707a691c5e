import type { MaterialFacts } from "@/bending/handbook/material";

/** A material as it is now; times are ISO 8601 strings. */
export interface MaterialView extends MaterialFacts {
  readonly version: number;
  readonly versionId: string;
  /** Not offered for new parts; parts that are made of it keep working. */
  readonly withdrawn: { readonly at: string; readonly by: string } | null;
  readonly changedAt: string;
  /** Empty: by the installation. */
  readonly changedBy: string;
}

/** One value that differs; texts carry no unit, `field` does. */
export interface ValueChange {
  readonly field: string;
  readonly from: string;
  readonly to: string;
}

export interface MaterialVersionView {
  readonly id: string;
  readonly version: number;
  readonly facts: MaterialFacts;
  readonly note: string;
  readonly at: string;
  readonly by: string;
  /** Against the version before; empty for the first. */
  readonly changes: readonly ValueChange[];
}

export interface MaterialDetail {
  readonly material: MaterialView;
  /** Newest first. */
  readonly versions: readonly MaterialVersionView[];
  /** Parts whose newest revision is of it, and plans made with each version by its id. */
  readonly parts: number;
  readonly plansByVersion: Readonly<Record<string, number>>;
}

/** What has become of the material that something was made with. */
export interface MaterialDrift {
  readonly materialId: string;
  /** Null: made before versions were kept. */
  readonly madeWith: number | null;
  readonly now: number;
  /** Values that calculations use and that are another now; empty: nothing to flag. */
  readonly changes: readonly ValueChange[];
  readonly withdrawn: boolean;
}
