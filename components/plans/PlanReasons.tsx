"use client";
import Link from "next/link";
import { useMemo, useState } from "react";
import { EmptyState } from "@/components/ui/EmptyState";
import { Facts } from "@/components/ui/Facts";
import { Panel } from "@/components/ui/Panel";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { classes } from "@/components/ui/classes";
import { buildPart } from "@/bending/part/buildPart";
import type { PlanReason } from "@/bending/plan/planDocument";
import { plannedBends } from "@/bending/plan/plannedBends";
import { mmPer } from "@/bending/core/units";
import { asSentence } from "@/lib/format/asSentence";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import type { PlanDetail } from "@/lib/schemas/views";
import { FindChanges } from "./changes/FindChanges";
import { FlatEvidence } from "./FlatEvidence";

/** Why there is no plan: each reason can be chosen, and shows the bends, faces and tools that it is about. */
export function PlanReasons({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const { plan, document, material } = detail;
  const [chosen, setChosen] = useState(0);
  const part = useMemo(() => {
    const built = buildPart(document, { materials: (id) => (id === material.id ? material : undefined), ...plannedBends(plan) });
    return built.ok ? built.value : null;
  }, [document, material, plan]);
  const reason = plan.reasons[chosen];
  if (!reason) return <EmptyState title="No reason was recorded">Plan the part again.</EmptyState>;
  return (
    <div className="space-y-8">
      <div className="grid gap-8 lg:grid-cols-2">
        <Panel title="What stands in the way" aside={`${plan.reasons.length} ${plan.reasons.length === 1 ? "reason" : "reasons"}`}>
          <ul className="border-t border-rule">
            {plan.reasons.map((entry, index) => (
              <li key={index} className="border-b border-rule">
                <button type="button" aria-pressed={index === chosen} onClick={() => setChosen(index)}
                  className={classes("flex w-full items-baseline gap-3 px-3 py-2.5 text-left", index === chosen ? "border-l-4 border-brick bg-brick-wash" : "border-l-4 border-transparent hover:bg-wash")}>
                  <span className="num text-ink-faint">{index + 1}</span><span>{asSentence(entry.message, [...entry.bends, ...entry.tools])}</span>
                </button>
              </li>
            ))}
          </ul>
          <p className="mt-3 text-sm text-ink-soft">{asSentence(plan.proof.method)}</p>
          <NextMoves detail={detail} mayWrite={mayWrite} />
        </Panel>
        <Panel title="Where" aside="The unfolded sheet, what the reason is about marked">
          {part ? <FlatEvidence part={part} bends={reason.bends} faces={reason.faces} className="h-80 w-full border border-rule bg-sheet" /> : null}
          <div className="mt-3"><Facts rows={evidence(reason, detail)} /></div>
        </Panel>
      </div>
      <Panel title="What would make it work" aside="the least of each kind, each really planned">
        {plan.firstFailure ? <p className="mb-3 max-w-prose">{plan.firstFailure.message}</p> : null}
        <FindChanges detail={detail} mayWrite={mayWrite} tried={null} />
      </Panel>
    </div>
  );
}

/** What to do about it: change the part, or see what the toolroom has and what is out of service. */
function NextMoves({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  return (
    <div className="mt-5 flex flex-wrap items-center gap-2">
      {mayWrite ? <Link href={`/parts/${detail.partId}/edit`} className={buttonClasses("primary")}>Change the part</Link> : null}
      <Link href="/tools" className={buttonClasses("plain")}>See the tools in service</Link>
      <Link href={`/parts/${detail.partId}`} className={buttonClasses("plain")}>{mayWrite ? "Plan again, or on another brake" : "See the part"}</Link>
    </div>
  );
}

function evidence(reason: PlanReason, { plan }: PlanDetail): readonly { readonly label: string; readonly value: string }[] {
  const format = createSheetFormat(plan.units);
  const per = mmPer(plan.units);
  const named = (label: string, names: readonly string[]) => (names.length > 0 ? [{ label, value: names.join(", ") }] : []);
  const found = reason.evidence;
  return [
    ...named("Bends", reason.bends), ...named("Faces", reason.faces), ...named("Tools", reason.tools),
    ...(found ? [
      { label: "At the stroke angle", value: format.angle(found.strokeAngle) },
      { label: "Depth of the overlap", value: format.fine(found.depth * per) },
      { label: "Along the bed, from the bend’s middle", value: `${format.place(found.zFrom * per)} to ${format.place(found.zTo * per)} ${plan.units}` },
    ] : []),
  ];
}
