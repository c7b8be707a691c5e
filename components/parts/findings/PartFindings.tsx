"use client";
import { useState, type ReactNode } from "react";
import type { Cure } from "@/bending/findings/finding";
import type { MarkedSheet } from "@/components/preview/markedSheet";
import { useToast } from "@/components/ui/ToastProvider";
import type { View } from "@/components/ui/drawing/fitView";
import { useShopLimits } from "@/lib/queries/shopLimits";
import type { PartDraft } from "../draft/partDraft";
import { pathName } from "../editor/pathName";
import { cureOnDraft } from "./cureOnDraft";
import { FindingMarks } from "./FindingMarks";
import { FindingsPanel } from "./FindingsPanel";
import { useFindings, type FindingsModel } from "./useFindings";

/** What the drawings of a part are given to show the findings on them. */
export interface DrawnFindings {
  readonly overFlat: (view: View) => ReactNode;
  readonly marked: MarkedSheet | undefined;
}

interface PartFindingsProps {
  readonly model: FindingsModel;
  /** The draft that cures are applied to, as any other change; absent where the part is only looked at. */
  readonly editing?: { readonly draft: PartDraft; readonly update: (change: (old: PartDraft) => PartDraft) => void };
  /** The drawings that are marked. */
  readonly children: (drawn: DrawnFindings) => ReactNode;
}

/** The findings of a part over its drawings, which show the one that is selected. */
export function PartFindings({ model, editing, children }: PartFindingsProps) {
  const shop = useShopLimits();
  const toast = useToast();
  const [selected, setSelected] = useState<string | null>(null);
  const findings = useFindings(model, shop.data ?? null);
  const list = findings?.list ?? [];
  const chosen = list.find(({ key }) => key === selected);
  const cureOf = (cure: Cure) => {
    if (editing === undefined || cureOnDraft(editing.draft, cure) === null) return null;
    const field = pathName(cure.path, editing.draft);
    return { field, apply: () => { editing.update((old) => cureOnDraft(old, cure) ?? old); toast("good", `${field}: ${cure.says}`, "Undo takes it back."); } };
  };
  return (
    <>
      <div className="bg-paper xl:sticky xl:top-2 xl:z-10">
        <FindingsPanel findings={findings} units={model.document.units} selected={selected} onSelect={setSelected} cureOf={cureOf} shopMissing={shop.isError} />
      </div>
      {children({
        overFlat: (view) => <FindingMarks findings={list} selected={selected} onSelect={setSelected} view={view} />,
        marked: chosen === undefined ? undefined : { faces: chosen.faces, bends: chosen.bends },
      })}
    </>
  );
}
