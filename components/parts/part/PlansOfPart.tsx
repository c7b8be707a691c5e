import { DataTable, type Column } from "@/components/ui/DataTable";
import { Panel } from "@/components/ui/Panel";
import { StateMark, type StateTone } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatMoment } from "@/lib/format/formatMoment";
import { formatSeconds } from "@/lib/format/formatSeconds";
import type { PlanListItem } from "@/lib/schemas/views";

const looks: Readonly<Record<PlanListItem["status"], { readonly tone: StateTone; readonly word: string }>> = {
  optimal: { tone: "good", word: "proven best" },
  feasible: { tone: "good", word: "works" },
  infeasible: { tone: "stop", word: "no order works" },
  unknown: { tone: "caution", word: "undecided" },
};

const columns: readonly Column<PlanListItem>[] = [
  { key: "createdAt", header: "Made", rowHeader: true, cell: (plan) => <TextLink href={`/plans/${plan.id}`}>{formatMoment(plan.createdAt)}</TextLink> },
  { key: "revision", header: "Rev.", align: "right", cell: (plan) => <span className="num">{plan.revision}</span> },
  { key: "machine", header: "Brake", cell: (plan) => plan.machine },
  { key: "status", header: "Answer", cell: (plan) => <StateMark tone={looks[plan.status].tone}>{looks[plan.status].word}</StateMark> },
  { key: "batch", header: "Batch", align: "right", cell: (plan) => <span className="num">{plan.batch}</span> },
  { key: "time", header: "Setup / each", align: "right", cell: (plan) => <span className="num whitespace-nowrap">{plan.steps === 0 ? "–" : `${formatSeconds(plan.setupSeconds)} / ${formatSeconds(plan.secondsPerPart)}`}</span> },
];

export function PlansOfPart({ plans }: { readonly plans: readonly PlanListItem[] }) {
  return (
    <Panel title="Plans">
      <DataTable caption="Plans of this part" columns={columns} rows={plans} rowKey={(plan) => plan.id} dense
        empty={<p className="text-ink-soft">No plan yet. “Plan the bends” finds an order and the tools for it.</p>} />
    </Panel>
  );
}
