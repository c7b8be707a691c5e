"use client";
import { useEffect, useMemo, useRef, type ClipboardEvent, type Dispatch, type KeyboardEvent, type SetStateAction } from "react";
import { flushSync } from "react-dom";
import { cellId } from "./cellId";
import { isBlankLine } from "./isBlankLine";
import { newTrialId } from "./newTrialId";
import { nextLine } from "./nextLine";
import { pastedLines } from "./pastedLines";
import type { RowActions } from "./TrialRow";
import type { LineField, TrialDraft, TrialLine } from "./trialDraft";

/** A mark alone in a cell stands for what is above it, as on paper. */
const ditto = new Set(['"', "″", "”", "''"]);

const focusCell = (line: string, field: LineField) => document.getElementById(cellId(line, field))?.focus();

/**
 * What keys and pasting do in the grid: Enter goes to the next line, from the last one with work in it to a new one; arrows up and down
 * move in the column; a ditto mark copies what is above; Ctrl+Delete removes the line; Ctrl+Enter saves.
 */
export function useTrialRows(draft: TrialDraft, setDraft: Dispatch<SetStateAction<TrialDraft>>, { onSave, onRemoved }: { readonly onSave: () => void; readonly onRemoved: (what: string, before: TrialDraft) => void }): RowActions {
  const now = useRef({ draft, lines: draft.lines, onSave, onRemoved });
  useEffect(() => { now.current = { draft, lines: draft.lines, onSave, onRemoved }; });
  return useMemo(() => {
    // On the screen before the key is done with: whoever types fast must not type into the cell before.
    const setLines = (next: (lines: readonly TrialLine[]) => readonly TrialLine[]) => flushSync(() => setDraft((old) => ({ ...old, lines: next(old.lines) })));
    const at = (line: string) => now.current.lines.findIndex(({ id }) => id === line);
    const remove = (line: string) => {
      const { lines } = now.current;
      if (lines.length === 1) return;
      const index = at(line);
      const beside = lines[index + 1] ?? lines[index - 1];
      const removed = lines[index];
      if (removed !== undefined && !isBlankLine(removed)) now.current.onRemoved(`Line ${index + 1} was removed.`, now.current.draft);
      setLines((old) => old.filter(({ id }) => id !== line));
      if (beside !== undefined) focusCell(beside.id, "angle");
    };
    const enter = (line: string, field: LineField) => {
      const { lines } = now.current;
      const index = at(line);
      const below = lines[index + 1];
      if (below !== undefined) { focusCell(below.id, field); return; }
      const here = lines[index];
      if (here === undefined || isBlankLine(here)) return;
      const added = nextLine(newTrialId(), here);
      setLines((old) => [...old, added]);
      focusCell(added.id, "angle");
    };
    return {
      text: (line, field, text) => setLines((old) => old.map((one, index) =>
        one.id === line ? { ...one, [field]: ditto.has(text.trim()) && index > 0 ? (old[index - 1]?.[field] ?? "") : text } : one)),
      keys: (line, field, event: KeyboardEvent<HTMLInputElement>) => {
        if (event.key === "Enter" && (event.ctrlKey || event.metaKey)) { event.preventDefault(); now.current.onSave(); return; }
        if (event.key === "Enter") { event.preventDefault(); enter(line, field); return; }
        if (event.key === "Delete" && event.ctrlKey) { event.preventDefault(); remove(line); return; }
        const step = event.key === "ArrowDown" ? 1 : event.key === "ArrowUp" ? -1 : 0;
        const beside = step === 0 || field === "material" ? undefined : now.current.lines[at(line) + step];
        if (beside !== undefined) { event.preventDefault(); focusCell(beside.id, field); }
      },
      paste: (line, field, event: ClipboardEvent<HTMLInputElement>) => {
        const laid = pastedLines(now.current.lines, event.clipboardData.getData("text/plain"), { line: at(line), field }, newTrialId);
        if (laid === null) return;
        event.preventDefault();
        setLines(() => laid);
      },
      remove,
    };
  }, [setDraft]);
}
