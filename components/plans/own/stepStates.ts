import type { OrderCheck } from "./useOrderCheck";

export type StepState = "looking" | "works" | "fails" | "unseen";

/** What is known of each step of an order: those before the first that fails work, those after it were not looked at. */
export function stepStates(count: number, { looking, failure }: Pick<OrderCheck, "looking" | "failure">): readonly StepState[] {
  return Array.from({ length: count }, (_, index): StepState => {
    if (looking) return "looking";
    if (failure === null) return "works";
    const at = (failure.step ?? failure.done.length + 1) - 1;
    return index < at ? "works" : index === at ? "fails" : "unseen";
  });
}

/** Sign and word together: the state is never told by colour alone. */
export const stepStateWords: Record<StepState, string> = { looking: "looking…", works: "can be made", fails: "cannot be made here", unseen: "not looked at" };
