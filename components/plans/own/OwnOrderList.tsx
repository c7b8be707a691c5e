"use client";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { FailureReason } from "@/bending/plan/planFailure";
import { moved } from "./moved";
import { OwnOrderRow } from "./OwnOrderRow";
import type { OwnOrderChoices } from "./OwnOrderWishes";
import type { StepState } from "./stepStates";
import { useDragOrder } from "./useDragOrder";
import type { OwnOrder } from "./useOwnOrder";

interface OwnOrderListProps {
  readonly own: OwnOrder;
  readonly states: readonly StepState[];
  /** What stops the step that fails. */
  readonly reasons: readonly FailureReason[];
  /** The best plan along the order; null until it is worked out. */
  readonly plan: PlanDocument | null;
  readonly choices: OwnOrderChoices;
}

/** The steps, to be put in another order by dragging, by buttons or by Alt with the arrow keys; what is wrong is said at the step where it is wrong. */
export function OwnOrderList({ own, states, reasons, plan, choices }: OwnOrderListProps) {
  const drag = useDragOrder(own.order, own.preview, own.settle);
  return (
    <ol aria-label="Your order" className="border-t border-ink">
      {own.order.map((entry, index) => (
        <OwnOrderRow key={entry} own={own} index={index} state={states[index] ?? "unseen"} reasons={reasons} choices={choices} drag={drag}
          made={plan?.steps.find(({ bends }) => bends.join("+") === entry)} onShift={(by) => own.settle(moved(own.order, index, index + by))} />
      ))}
    </ol>
  );
}
