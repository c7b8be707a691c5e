"use client";
import { useEffect, useRef, useState, type FocusEvent } from "react";
import { mmPer } from "@/bending/core/units";
import type { PartPicking } from "@/components/preview/partPicking";
import { faceEdges } from "../drawing/faceEdges";
import type { PartDraft } from "../draft/partDraft";
import { faceOfField, pathOfBend, pathOfFace } from "../draft/pathOfFace";
import { addFlange } from "./addFlange";
import type { PreviewModel } from "./computePreview";
import { fieldId } from "./fieldId";

interface PickingFacts {
  readonly draft: PartDraft;
  readonly shown: PreviewModel | null;
  readonly update: (change: (old: PartDraft) => PartDraft) => void;
}

/**
 * Table and drawings as one thing: what is picked in a drawing takes the cursor to its field, an edge that is picked
 * carries a new flange whose length can be typed at once, and the field with the cursor shows its face.
 */
export function usePicking({ draft, shown, update }: PickingFacts): { readonly picking: PartPicking; readonly onFocus: (event: FocusEvent) => void } {
  const [picked, setPicked] = useState<string | null>(null);
  const wanted = useRef<string | null>(null);
  const goTo = (path: string | null) => {
    const field = path === null ? null : document.getElementById(fieldId(path));
    field?.focus();
    if (field instanceof HTMLInputElement) field.select();
    return field !== null;
  };
  // A flange that was just added has its field only after this change is on the screen.
  useEffect(() => {
    if (wanted.current !== null && goTo(wanted.current)) wanted.current = null;
  });
  const picking: PartPicking = {
    picked,
    onFace: (face) => { setPicked(face); goTo(pathOfFace(draft, face)); },
    onBend: (bend) => { setPicked(bend); goTo(pathOfBend(draft, bend)); },
    edges: shown?.document.base === undefined ? [] : faceEdges(shown.part, shown.document.base, mmPer(shown.document.units)),
    onEdge: ({ face, edge }) => {
      wanted.current = `flanges[${draft.flanges.length}].length`;
      update((old) => addFlange(old, face, edge));
    },
  };
  return { picking, onFocus: ({ target }) => { const face = faceOfField(draft, target.id); if (face !== null) setPicked(face); } };
}
