"use client";
import { useDeferredValue, useMemo, useState } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDraft } from "../draft/partDraft";
import { computePreview, type Preview, type PreviewModel } from "./computePreview";

/** The part while it is typed; the last good model stays in sight while something is wrong. */
export function usePreview(draft: PartDraft, materials: readonly MaterialFacts[]): Preview & { readonly shown: PreviewModel | null } {
  const settled = useDeferredValue(draft);
  const preview = useMemo(() => computePreview(settled, materials), [settled, materials]);
  const [shown, setShown] = useState(preview.model);
  if (preview.model !== null && preview.model !== shown) setShown(preview.model);
  return { ...preview, shown: preview.model ?? shown };
}
