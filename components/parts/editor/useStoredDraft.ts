"use client";
import { useEffect, useState } from "react";
import type { PartDraft } from "../draft/partDraft";

interface Stored { readonly savedAt: string; readonly basedOn: number; readonly draft: PartDraft }

/** What is typed now, what it was before each change, and when the last change came. */
interface History { readonly draft: PartDraft; readonly past: readonly PartDraft[]; readonly at: number }

/** Changes that follow one another faster are taken back together: a number that is typed is one change. */
const TOGETHER_MS = 800;
const KEPT_MOST = 50;

/** Grows when the shape of a draft changes, so that an old one is not read as a new one. */
const version = 1;

function read(key: string): Stored | null {
  try {
    const text = window.localStorage.getItem(key);
    const stored = text === null ? null : (JSON.parse(text) as Partial<Stored> | null);
    return stored?.draft?.shape !== undefined && Array.isArray(stored.draft.legs) ? (stored as Stored) : null;
  } catch {
    return null;
  }
}

/**
 * What is being typed, kept in this browser until it is saved or thrown away: it survives a reload, a failed
 * save and a lost network. `basedOn` is the revision it started from (0: a new part).
 */
export function useStoredDraft(name: string, basedOn: number, start: () => PartDraft) {
  const key = `foldwright.part-draft.${version}.${name}`;
  const [begun] = useState(() => ({ stored: read(key), start: start() }));
  const [{ draft, past }, setHistory] = useState<History>({ draft: begun.stored?.draft ?? begun.start, past: [], at: 0 });
  const [restoredAt, setRestoredAt] = useState(begun.stored?.savedAt ?? null);
  const [base, setBase] = useState(begun.stored?.basedOn ?? basedOn);
  const changed = draft !== begun.start;
  useEffect(() => {
    if (!changed) return undefined;
    const timer = setTimeout(() => {
      try {
        window.localStorage.setItem(key, JSON.stringify({ savedAt: new Date().toISOString(), basedOn: base, draft } satisfies Stored));
      } catch {
        // A full or forbidden store only means that a reload starts afresh.
      }
    }, 300);
    return () => clearTimeout(timer);
  }, [key, draft, base, changed]);
  const forget = () => window.localStorage.removeItem(key);
  const change = (next: (old: PartDraft) => PartDraft, together: boolean) => {
    const at = Date.now();
    setHistory((old) => ({ draft: next(old.draft), past: together && at - old.at < TOGETHER_MS ? old.past : [...old.past.slice(1 - KEPT_MOST), old.draft], at }));
  };
  const setDraft = (next: (old: PartDraft) => PartDraft) => change(next, true);
  const undo = () => {
    const back = past.at(-1);
    if (back === undefined) return;
    if (back === begun.start) forget();
    setHistory({ draft: back, past: past.slice(0, -1), at: 0 });
  };
  const startAgain = () => { forget(); change(() => begun.start, false); setBase(basedOn); setRestoredAt(null); };
  return { draft, setDraft, undo: past.length === 0 ? null : undo, basedOn: base, setBasedOn: setBase, restoredAt, changed, forget, startAgain };
}
