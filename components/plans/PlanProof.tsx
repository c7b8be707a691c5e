import { Facts } from "@/components/ui/Facts";
import { asSentence } from "@/lib/format/asSentence";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";

/** How it is known that the plan is that good, and what it takes. */
export function PlanProof({ plan }: { readonly plan: PlanDocument }) {
  const format = createSheetFormat(plan.units);
  return (
    <>
      <Facts rows={[
        { label: "Setup", value: <span className="num">{format.time(plan.seconds.setup)}</span> },
        { label: "Each part", value: <span className="num">{format.time(plan.seconds.perPart)}</span> },
        { label: `Batch of ${plan.batch}`, value: <span className="num">{format.time(plan.seconds.total)}</span> },
        { label: "No plan can take less than", value: <span className="num">{format.time(plan.proof.bound)}</span> },
        { label: "States looked at", value: <span className="num">{plan.proof.expanded}</span> },
      ]} />
      <p className="mt-3 text-sm text-ink-soft">{asSentence(plan.proof.method)}</p>
      <p className="mt-1 text-sm text-ink-faint">Times are the brake’s settings for a flip, a turn, a walk and a stroke; the plan is as good as they are. <span className="num">{plan.engine}</span></p>
    </>
  );
}
