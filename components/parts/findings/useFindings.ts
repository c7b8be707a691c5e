"use client";
import { startTransition, useEffect, useState } from "react";
import { findingsOf, type Findings } from "@/bending/findings/findingsOf";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import type { FlatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";

export interface FindingsModel { readonly part: PartModel; readonly document: PartDocument; readonly flat?: FlatPattern }

export interface FindingsState extends Findings {
  /** The findings are those of the part as it was a moment ago. */
  readonly behind: boolean;
}

/** Larger parts are judged when the typing rests, so that it stays fluid. */
const LARGE_BENDS = 40;
const REST_MS = 250;

const none: Findings = { list: [], leftOut: [] };

/** What is wrong with a part, worked out beside the typing; null until it was judged for the first time. */
export function useFindings(model: FindingsModel | null, shop: ShopLimits | null): FindingsState | null {
  const [judged, setJudged] = useState<{ readonly model: FindingsModel; readonly shop: ShopLimits | null; readonly findings: Findings } | null>(null);
  useEffect(() => {
    if (model === null) return undefined;
    const timer = setTimeout(() => {
      const findings = findingsOf({ part: model.part, document: model.document, shop, flat: model.flat });
      startTransition(() => setJudged({ model, shop, findings }));
    }, model.part.bends.length > LARGE_BENDS ? REST_MS : 0);
    return () => clearTimeout(timer);
  }, [model, shop]);
  if (model === null) return { ...none, behind: false };
  return judged === null ? null : { ...judged.findings, behind: judged.model !== model || judged.shop !== shop };
}
