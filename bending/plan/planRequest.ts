import type { MaterialLookup } from "../handbook/material";
import type { PartDocument } from "../part/partDocument";
import type { ShopTable } from "../shopTable/shopCell";
import type { Machine } from "../tooling/machine";
import type { Tool } from "../tooling/tool";
import type { BendWish } from "./bendWish";
import type { PlanMemory } from "./planMemory";

export interface PlanProgress {
  /** Search states looked at so far. */
  readonly expanded: number;
  /** 0..1, or null when unknown. */
  readonly fraction: number | null;
  readonly message: string;
}

/** What a plan is asked for. `tools` are the ones in service; `now` is a clock in milliseconds, if elapsed time is wanted. */
export interface PlanRequest {
  readonly document: PartDocument;
  readonly materials: MaterialLookup;
  /** The shop's own measured values; absent: the handbook alone speaks. */
  readonly shopTable?: ShopTable;
  readonly tools: readonly Tool[];
  readonly machine: Machine;
  readonly batch: number;
  /** What the formula's air-bend force is multiplied by, from the shop's own experience; 1 unless said. */
  readonly airForceFactor?: number;
  /** How many other plans to give beside the best. */
  readonly alternatives?: number;
  /** Be content with the first plan that is found: whether there is one is all that is asked. */
  readonly firstPlan?: boolean;
  /** What a person asks of single bends; the planner is free in everything else. */
  readonly wishes?: readonly BendWish[];
  /** What earlier plans of the same request with other times or another batch worked out. */
  readonly memory?: PlanMemory;
  readonly shouldStop?: () => boolean;
  readonly onProgress?: (progress: PlanProgress) => void;
  readonly now?: () => number;
}

/** A person's own order: bend ids, those of one stroke joined with "+". */
export interface CheckRequest extends PlanRequest {
  readonly order: readonly string[];
}
