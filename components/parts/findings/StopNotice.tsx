"use client";
import { useMemo } from "react";
import type { PartDocument } from "@/bending/part/partDocument";
import { Notice } from "@/components/ui/Notice";
import { useMaterials } from "@/lib/queries/materials";
import { useShopLimits } from "@/lib/queries/shopLimits";
import { useShopTable } from "@/lib/queries/shopTable";
import { partModelOf } from "../part/partModelOf";
import { useFindings } from "./useFindings";

/** Told at most; the rest is counted. */
const TOLD_MOST = 5;

/** Says before anything is planned what stands against the part; it forbids nothing, as the planner decides for itself. */
export function StopNotice({ document }: { readonly document: PartDocument }) {
  const materials = useMaterials();
  const shop = useShopLimits();
  const table = useShopTable(document.material);
  const built = useMemo(() => (materials.data === undefined ? null : partModelOf(document, materials.data, table.data)), [document, materials.data, table.data]);
  const model = useMemo(() => (built?.ok === true ? { part: built.value.part, document } : null), [built, document]);
  const findings = useFindings(model, shop.data ?? null);
  const stops = (findings?.list ?? []).filter(({ severity }) => severity === "stop");
  if (stops.length === 0) return null;
  return (
    <Notice tone="caution" title={stops.length === 1 ? "One finding says that this part cannot be made" : `${stops.length} findings say that this part cannot be made`}>
      <ul className="list-disc space-y-0.5 pl-4">
        {stops.slice(0, TOLD_MOST).map((finding) => <li key={finding.key}><span className="font-medium text-ink">{finding.title}.</span> {finding.message}</li>)}
      </ul>
      {stops.length > TOLD_MOST ? <p>and {stops.length - TOLD_MOST} more</p> : null}
      <p>The planner looks all the same; expect it to find no order.</p>
    </Notice>
  );
}
