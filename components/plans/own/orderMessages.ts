import type { BendWish } from "@/bending/plan/bendWish";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanFailure } from "@/bending/plan/planFailure";
import type { PlanShopView } from "@/lib/schemas/views";

/** An order to be tried: strokes, and what is asked of single bends. */
export interface TriedOrder {
  readonly order: readonly string[];
  readonly wishes: readonly BendWish[];
}

/** What the thread that tries orders is asked. `try`: which step fails first, in a moment; `plan`: the best plan along the order. */
export type OrderAsk =
  | { readonly kind: "open"; readonly task: PlanShopView["task"] }
  | { readonly kind: "try" | "plan"; readonly id: number; readonly tried: TriedOrder };

export type OrderAnswer =
  /** `whole` false: it fails on the likeliest V; on the others it is still being looked at, and another answer follows. */
  | { readonly kind: "tried"; readonly id: number; readonly failure: PlanFailure | null; readonly whole: boolean }
  | { readonly kind: "planned"; readonly id: number; readonly plan: PlanDocument };
