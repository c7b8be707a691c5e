import type { StateTone } from "@/components/ui/StateMark";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanOrigin } from "@/lib/schemas/views";

interface StatusWords {
  readonly tone: StateTone;
  readonly word: string;
  readonly sentence: string;
}

/** A plan's status as a mark and a sentence. */
export function planStatus(status: PlanDocument["status"], gap: number, origin: PlanOrigin = "planned"): StatusWords {
  const percent = `${(gap * 100).toFixed(1)} %`;
  const own = origin === "own order";
  switch (status) {
    case "optimal": return { tone: "good", word: own ? "best of this order" : "optimal", sentence: own ? "Clears the tools, and nothing else takes less time in this order: proven." : "Clears the tools, and no other order or setup takes less time: proven." };
    case "feasible": return { tone: "note", word: gap === 0 ? "works" : `within ${percent}`, sentence: gap === 0 ? "Clears the tools." : `Clears the tools. At most ${percent} of its time could be saved by any other plan${own ? " of this order" : ""}.` };
    case "infeasible": return { tone: "stop", word: "cannot be made", sentence: own ? "This order cannot be made with the tools in service on this brake. The reasons below say what stands in the way." : "No order of the bends works with the tools in service on this brake. The reasons below say what stands in the way." };
    case "unknown": return { tone: "caution", word: "undecided", sentence: "The search ended before it found a plan or a proof that there is none." };
    default: return status satisfies never;
  }
}
