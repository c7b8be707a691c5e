import type { StateTone } from "@/components/ui/StateMark";
import type { PlanDocument } from "@/bending/plan/planDocument";

/** A plan's status as a mark and a sentence. */
export function planStatus(status: PlanDocument["status"], gap: number): { readonly tone: StateTone; readonly word: string; readonly sentence: string } {
  switch (status) {
    case "optimal": return { tone: "good", word: "optimal", sentence: "Clears the tools, and no other order or setup takes less time: proven." };
    case "feasible": return { tone: "note", word: `within ${(gap * 100).toFixed(1)} %`, sentence: `Clears the tools. It takes at most ${(gap * 100).toFixed(1)} % more time than the least possible.` };
    case "infeasible": return { tone: "stop", word: "cannot be made", sentence: "No order of the bends works with the tools in service on this brake. The reasons below say what stands in the way." };
    case "unknown": return { tone: "caution", word: "undecided", sentence: "The search ended before it found a plan or a proof that there is none." };
    default: return status satisfies never;
  }
}
