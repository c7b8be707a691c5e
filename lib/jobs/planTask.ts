import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDocument } from "@/bending/part/partDocument";
import type { BendWish } from "@/bending/plan/bendWish";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";

/** A planning question as plain data, so that it can be sent to another thread. */
export interface PlanTask {
  readonly document: PartDocument;
  readonly material: MaterialFacts;
  /** The shop's measured values of that material; absent when there are none. */
  readonly shopTable?: ShopTable;
  readonly tools: readonly Tool[];
  readonly machine: Machine;
  readonly batch: number;
  /** The shop's own; absent: the formula's force as it is. */
  readonly airForceFactor?: number;
  readonly alternatives: number;
  /** A person's own order, to be followed; absent: the planner is free. */
  readonly order?: readonly string[];
  /** What a person asks of single bends. */
  readonly wishes?: readonly BendWish[];
  /** When the search stops with the best so far. */
  readonly limitMs: number;
}
