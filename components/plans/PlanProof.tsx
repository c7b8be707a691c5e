import { Facts } from "@/components/ui/Facts";
import { Panel } from "@/components/ui/Panel";
import { asSentence } from "@/lib/format/asSentence";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import type { PlanDetail } from "@/lib/schemas/views";
import { Firmness } from "./Firmness";
import { SearchOn } from "./SearchOn";

/** How it is known that the plan is that good, over what, and what it takes; and the way to search on where the time ended the search. */
export function PlanProof({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const { plan, ended, limitSeconds, origin } = detail;
  const format = createSheetFormat(plan.units);
  const works = plan.steps.length > 0;
  const saved = plan.seconds.total - plan.proof.bound;
  return (
    <div className="grid gap-8 lg:grid-cols-2">
      <Panel title="What is proven">
        <p className="max-w-prose">{proven(detail)}</p>
        <p className="mt-2 max-w-prose text-ink-soft"><span className="font-medium text-ink">Looked over: </span>{asSentence(plan.proof.method)}</p>
        <div className="mt-3"><Facts rows={[
          ...(works ? [
            { label: "No plan can take less than", value: <span className="num">{format.time(plan.proof.bound)}</span> },
            { label: "Left to be gained at most", value: <span className="num">{saved < 0.5 ? "nothing" : `${format.time(saved)} (${(plan.gap * 100).toFixed(1)} %)`}</span> },
          ] : []),
          { label: "States looked at", value: <span className="num">{plan.proof.expanded.toLocaleString("en-GB")}</span> },
          { label: "Searched for", value: <span className="num">{searched(plan.elapsedMs)}</span> },
          { label: "Ended by", value: ended === "itself" ? "itself: searching on would change nothing" : ended === "limit" ? `its time, ${limitSeconds} s` : "a person, the best so far was kept" },
          { label: "Planner", value: <span className="num">{plan.engine}</span> },
        ]} /></div>
        {ended !== "itself" && mayWrite ? <div className="mt-4"><SearchOn planId={detail.id} gap={works ? plan.gap : null} /></div> : null}
      </Panel>
      {works ? (
        <Panel title="Time" aside="by the brake’s settings for a flip, a turn, a walk and a stroke">
          <Facts rows={[
            { label: "Setup", value: <span className="num">{format.time(plan.seconds.setup)}</span> },
            { label: "Each part", value: <span className="num">{format.time(plan.seconds.perPart)}</span> },
            { label: `Batch of ${plan.batch}`, value: <span className="num">{format.time(plan.seconds.total)}</span> },
          ]} />
          <p className="mt-3 text-sm text-ink-faint">Times are the brake’s settings; the plan is as good as they are.</p>
        </Panel>
      ) : null}
      {plan.status === "optimal" && origin !== "chosen" ? <div className="lg:col-span-2"><Firmness detail={detail} mayWrite={mayWrite} /></div> : null}
    </div>
  );
}

const searched = (ms: number): string => (ms < 1000 ? `${Math.max(1, Math.round(ms))} ms` : `${(ms / 1000).toFixed(1)} s`);

function proven({ plan, origin }: PlanDetail): string {
  const along = origin === "own order" ? " that follows this order" : "";
  switch (plan.status) {
    case "optimal": return `Every plan${along} was ruled out that takes less time, either by looking at it or by a bound that holds for all of its kind.`;
    case "feasible": return `The plan clears every tool at every step. Whether one${along} takes less time is not settled: the bound below says how much less at most.`;
    case "infeasible": return `Every order${along} ends at a step that no tool in service, front and place on the bed can make. The reasons name what stands in the way.`;
    case "unknown": return `Neither a plan${along} nor a proof that there is none was found in the time.`;
    default: return plan.status satisfies never;
  }
}
