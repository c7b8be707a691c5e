"use client";
import { Redo2, RotateCcw, Undo2 } from "lucide-react";
import { useMemo } from "react";
import { Button } from "@/components/ui/Button";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { buildPart } from "@/bending/part/buildPart";
import { plannedBends } from "@/bending/plan/plannedBends";
import { usePlanShop } from "@/lib/queries/plans";
import type { PlanDetail, PlanShopView } from "@/lib/schemas/views";
import { FindChanges } from "../changes/FindChanges";
import { OwnOrderList } from "./OwnOrderList";
import { OwnOrderVerdict } from "./OwnOrderVerdict";
import { OwnOrderStage } from "./OwnOrderStage";
import { stepStates } from "./stepStates";
import { useOrderCheck } from "./useOrderCheck";
import { useOwnOrder } from "./useOwnOrder";

/** An order of one's own, looked over while it is made; with today's shop, which is loaded first. */
export function OwnOrder({ detail, mayWrite }: { readonly detail: PlanDetail; readonly mayWrite: boolean }) {
  const shop = usePlanShop(detail.id);
  if (shop.isPending) return <Loading what="the tools and settings of today" />;
  if (shop.isError) return <LoadProblem what="What an order is tried with" error={shop.error} onRetry={() => void shop.refetch()} />;
  return <OwnOrderWork detail={detail} shop={shop.data} mayWrite={mayWrite} />;
}

function OwnOrderWork({ detail, shop, mayWrite }: { readonly detail: PlanDetail; readonly shop: PlanShopView; readonly mayWrite: boolean }) {
  const { plan, document, material } = detail;
  const { task } = shop;
  const part = useMemo(() => {
    const built = buildPart(document, { materials: (id) => (id === material.id ? material : undefined), ...plannedBends(plan) });
    return built.ok ? built.value : null;
  }, [document, material, plan]);
  const own = useOwnOrder({ order: startOrder(detail, part?.bends.map(({ id }) => id) ?? []), wishes: [] });
  const tried = useMemo(() => ({ order: own.order, wishes: own.wishes }), [own.order, own.wishes]);
  const check = useOrderCheck(task, tried);
  const states = stepStates(own.order.length, check);
  const reasons = check.failure?.strokes[0]?.reasons ?? [];
  const choices = useMemo(() => {
    const ofKind = (kind: "punch" | "die", tang: string) => task.tools.filter((tool) => tool.kind === kind && tool.tang === tang).map(({ id }) => ({ value: id, label: id }));
    return {
      fronts: (entry: string) => {
        const bend = part?.bends.find(({ id }) => id === entry.split("+")[0]);
        return bend && part ? [bend.parent, bend.child].flatMap((face) => part.faces[face]?.id ?? []) : [];
      },
      punches: ofKind("punch", task.machine.punchTang),
      dies: ofKind("die", task.machine.dieTang),
    };
  }, [task, part]);
  return (
    <div className="space-y-5">
      {shop.asPlanned ? null : <Notice tone="note" title="The shop has changed since this plan was made">Orders are tried with the tools, pieces and settings of today; times may differ from the plan’s for that reason alone.</Notice>}
      {check.broken ? <Notice tone="wrong" title="This browser could not try the order" live>Use “Plan this order”: the server tries it then.</Notice> : null}
      <div className="grid gap-6 xl:grid-cols-[minmax(0,1fr)_minmax(26rem,42%)]">
        <Panel title="Your order" aside={<span className="flex flex-wrap gap-1">
          <Button look="quiet" size="small" icon={<Undo2 aria-hidden />} disabled={!own.mayUndo} onClick={own.undo}>Undo</Button>
          <Button look="quiet" size="small" icon={<Redo2 aria-hidden />} disabled={!own.mayRedo} onClick={own.redo}>Redo</Button>
          <Button look="quiet" size="small" icon={<RotateCcw aria-hidden />} onClick={own.startOver}>Start over</Button>
        </span>}>
          <OwnOrderList own={own} states={states} reasons={reasons} plan={check.plan} choices={choices} />
        </Panel>
        <div className="space-y-4 xl:sticky xl:top-4 xl:self-start">
          <OwnOrderVerdict detail={detail} tried={tried} check={check} mayWrite={mayWrite} />
          <OwnOrderStage detail={detail} task={task} part={part} check={check} />
        </div>
      </div>
      {check.failure === null ? null : (
        <Panel title="What would make this order work" aside="the least of each kind, each really planned">
          <FindChanges detail={detail} mayWrite={mayWrite} tried={tried} act={(change) => {
            const { order } = change;
            return order === undefined ? null : <Button look="plain" size="small" className="mt-1" onClick={() => own.settle(order)}>Take this order</Button>;
          }} />
        </Panel>
      )}
    </div>
  );
}

/** The strokes of the plan; when there is none, the bends as they were drawn. */
function startOrder({ plan }: PlanDetail, bends: readonly string[]): readonly string[] {
  const strokes = plan.order.filter((entry, index) => plan.order.indexOf(entry) === index);
  return strokes.length > 0 ? strokes : bends;
}
