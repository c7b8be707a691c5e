"use client";
import { useEffect, useEffectEvent, useState } from "react";
import type { PartDraft } from "../draft/partDraft";
import { beginHistory, changeHistory, redoHistory, undoHistory } from "./draftHistory";

interface Stored { readonly savedAt: string; readonly basedOn: number; readonly draft: PartDraft }

/** Grows when the shape of a draft changes, so that an old one is not read as a new one. */
const version = 3;

function read(key: string): Stored | null {
  try {
    const text = window.localStorage.getItem(key);
    const stored = text === null ? null : (JSON.parse(text) as Partial<Stored> | null);
    return stored?.draft?.shape !== undefined && Array.isArray(stored.draft.legs) ? (stored as Stored) : null;
  } catch {
    return null;
  }
}

/** The text field that is being typed in; null when something else is used. */
function fieldInUse(): string | null {
  const used = document.activeElement;
  return used instanceof HTMLTextAreaElement || (used instanceof HTMLInputElement && used.type === "text") ? used.id : null;
}

/**
 * What is being typed, kept in this browser until it is saved or thrown away: it survives a reload, a failed
 * save and a lost network. `basedOn` is the revision it started from (0: a new part).
 */
export function useStoredDraft(name: string, basedOn: number, start: () => PartDraft) {
  const key = `foldwright.part-draft.${version}.${name}`;
  const [begun] = useState(() => ({ stored: read(key), start: start() }));
  const [history, setHistory] = useState(() => beginHistory(begun.stored?.draft ?? begun.start));
  const { draft, past, future } = history;
  const [restoredAt, setRestoredAt] = useState(begun.stored?.savedAt ?? null);
  const [base, setBase] = useState(begun.stored?.basedOn ?? basedOn);
  const changed = draft !== begun.start;
  const store = useEffectEvent(() => {
    if (!changed) return;
    try {
      window.localStorage.setItem(key, JSON.stringify({ savedAt: new Date().toISOString(), basedOn: base, draft } satisfies Stored));
    } catch {
      // A full or forbidden store only means that a reload starts afresh.
    }
  });
  useEffect(() => {
    const timer = setTimeout(() => store(), 300);
    return () => clearTimeout(timer);
  }, [draft, base]);
  useEffect(() => {
    const leave = () => store();
    window.addEventListener("pagehide", leave);
    return () => window.removeEventListener("pagehide", leave);
  }, []);
  const forget = () => window.localStorage.removeItem(key);
  const change = (next: (old: PartDraft) => PartDraft, field: string | null) => {
    const now = Date.now();
    setHistory((old) => changeHistory(old, next(old.draft), now, field));
  };
  const setDraft = (next: (old: PartDraft) => PartDraft) => change(next, fieldInUse());
  const undo = () => {
    if (past.at(-1) === begun.start) forget();
    setHistory(undoHistory);
  };
  const redo = () => setHistory(redoHistory);
  const startAgain = () => { forget(); change(() => begun.start, null); setBase(basedOn); setRestoredAt(null); };
  return { draft, setDraft, undo: past.length === 0 ? null : undo, redo: future.length === 0 ? null : redo, basedOn: base, setBasedOn: setBase, restoredAt, changed, forget, startAgain };
}
