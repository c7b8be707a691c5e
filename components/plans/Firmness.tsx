"use client";
import { Gauge } from "lucide-react";
import type { PlanRobustness, RobustnessEnd, TimeSetting } from "@/bending/plan/planRobustness";
import { JobLine } from "@/components/planJobs/JobLine";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { formatNumber } from "@/lib/format/formatNumber";
import { usePlanJobList } from "@/lib/queries/planJobs";
import { useFindRobustness } from "@/lib/queries/plans";
import type { PlanDetail } from "@/lib/schemas/views";

const names: Record<TimeSetting, string> = {
  flip: "a flip", turn: "a quarter turn", walkPerMetre: "a metre of walking", stroke: "a stroke", gaugeMove: "a move of the gauge", stationSetup: "setting up a station", sectionPlace: "placing a section",
};

/** How far the brake's times may be off before another plan wins: looked for on request, as it takes many plans. */
export function Firmness({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const start = useFindRobustness(detail.id);
  const jobs = usePlanJobList({ planId: detail.id });
  const running = jobs.data?.find(({ kind, state }) => kind === "firm" && state === "running");
  const found = jobs.data?.flatMap(({ result }) => (result?.kind === "firm" ? [result.robustness] : []))[0] ?? detail.plan.robustness;
  return (
    <Panel title="If the times are off" aside="one setting at a time, the others as they are">
      {found ? <Table found={found} /> : <p className="max-w-prose text-ink-soft">The plan is the best by the brake’s own times for a flip, a turn, a walk and a stroke. How wrong may they be before another plan would be quicker?</p>}
      <div className="mt-3 space-y-2">
        {running ? <JobLine job={running} mayWrite={mayWrite} here={detail.id} /> : null}
        {start.error === null ? null : <Notice tone="wrong" title="It was not looked for" live>{start.error.message}</Notice>}
        {mayWrite && !running ? <Button look="plain" icon={<Gauge aria-hidden />} busy={start.isPending} onClick={() => start.mutate()}>{found ? "Look again" : "Find how far they may be off"}</Button> : null}
      </div>
    </Panel>
  );
}

function Table({ found: { settings, range } }: { readonly found: PlanRobustness }) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="How far the times may be off">
      <table className="w-full border-collapse text-left text-sm">
        <thead><tr className="border-b border-rule-strong">{["Time of", "Set to", "Paid", "Stays the best", "Beyond that"].map((head) => <th key={head} scope="col" className="py-1 pr-3 font-medium text-ink-soft">{head}</th>)}</tr></thead>
        <tbody>
          {settings.map(({ setting, seconds, count, low, high, settled }) => (
            <tr key={setting} className="border-b border-rule align-top">
              <th scope="row" className="py-1.5 pr-3 font-medium">{names[setting]}</th>
              <td className="num py-1.5 pr-3 whitespace-nowrap">{say(seconds)}</td>
              <td className="num py-1.5 pr-3 whitespace-nowrap">{formatNumber(count, 1)}{setting === "walkPerMetre" ? " m" : " ×"}</td>
              <td className="py-1.5 pr-3">{staysWords(low, high, seconds, range)}{settled ? null : <span className="block text-ink-soft">not settled: the time ended</span>}</td>
              <td className="py-1.5 pr-3 text-ink-soft">{[end("less", low), end("more", high)].filter((text) => text !== "").map((text) => <span key={text} className="block">{text}</span>)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const say = (seconds: number): string => `${formatNumber(seconds, 1)} s`;

function staysWords(low: RobustnessEnd | null, high: RobustnessEnd | null, seconds: number, [least, most]: readonly [number, number]): string {
  if (low === null && high === null) return `whatever it is, from ${say(seconds * least)} to ${say(seconds * most)}`;
  if (low === null) return `up to ${say(high?.seconds ?? 0)}`;
  return high === null ? `from ${say(low.seconds)} on` : `between ${say(low.seconds)} and ${say(high.seconds)}`;
}

const end = (word: string, found: RobustnessEnd | null): string => (found === null ? "" : `${word}: ${found.differs}`);
