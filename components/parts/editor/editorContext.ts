"use client";
import { createContext, useContext } from "react";
import type { MaterialGroup } from "@/bending/handbook/material";
import type { PartDraft } from "../draft/partDraft";

export interface Editor {
  readonly draft: PartDraft;
  readonly update: (change: (draft: PartDraft) => PartDraft) => void;
  /** What is wrong at a path of the document, for the field that stands for it. */
  readonly problemAt: (path: string) => string | undefined;
  /** Whose gauge table the thickness is read from. */
  readonly gaugeGroup: MaterialGroup | undefined;
}

export const EditorContext = createContext<Editor | null>(null);

export function useEditor(): Editor {
  const editor = useContext(EditorContext);
  if (editor === null) throw new Error("useEditor stands outside of a part editor");
  return editor;
}
