"use client";
import { useDeferredValue, useMemo, useState } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import { useShopTable } from "@/lib/queries/shopTable";
import type { PartDraft } from "../draft/partDraft";
import { computePreview, type Preview, type PreviewModel } from "./computePreview";

/** The part while it is typed; the last good model stays in sight while something is wrong. */
export function usePreview(draft: PartDraft, materials: readonly MaterialFacts[]): Preview & { readonly shown: PreviewModel | null } {
  const settled = useDeferredValue(draft);
  const { data: shopTable } = useShopTable(settled.material);
  const preview = useMemo(() => computePreview(settled, materials, shopTable), [settled, materials, shopTable]);
  const [shown, setShown] = useState(preview.model);
  if (preview.model !== null && preview.model !== shown) setShown(preview.model);
  return { ...preview, shown: preview.model ?? shown };
}
