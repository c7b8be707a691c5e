"use client";
import { useEffect, useState } from "react";
import { isBlankLine } from "./isBlankLine";
import type { TrialDraft } from "./trialDraft";

interface Stored { readonly savedAt: string; readonly draft: TrialDraft }

/** Grows when the shape of a draft changes, so that an old one is not read as a new one. */
const version = 1;

function read(key: string): Stored | null {
  try {
    const text = window.localStorage.getItem(key);
    const stored = text === null ? null : (JSON.parse(text) as Partial<Stored> | null);
    return Array.isArray(stored?.draft?.lines) && stored.draft.lines.length > 0 ? (stored as Stored) : null;
  } catch {
    return null;
  }
}

const hasWork = (draft: TrialDraft): boolean => draft.lines.some((line) => !isBlankLine(line));

/**
 * The trials being typed, kept in this browser for this person until they are saved or thrown away. `start` begins a page, out of the
 * last one when there was one with nothing left to save.
 */
export function useTrialDraft(person: string, start: (last: TrialDraft | null) => TrialDraft) {
  const key = `foldwright.bend-trials.${version}.${person}`;
  const [begun] = useState(() => {
    const stored = read(key);
    return stored !== null && hasWork(stored.draft) ? { draft: stored.draft, at: stored.savedAt } : { draft: start(stored?.draft ?? null), at: null };
  });
  const [draft, setDraft] = useState(begun.draft);
  const [restoredAt, setRestoredAt] = useState(begun.at);
  const changed = draft !== begun.draft;
  useEffect(() => {
    if (!changed) return undefined;
    const timer = setTimeout(() => {
      try {
        window.localStorage.setItem(key, JSON.stringify({ savedAt: new Date().toISOString(), draft } satisfies Stored));
      } catch {
        // A full or forbidden store only means that a reload starts afresh.
      }
    }, 300);
    return () => clearTimeout(timer);
  }, [key, draft, changed]);
  const startAgain = (next: TrialDraft) => { window.localStorage.removeItem(key); setDraft(next); setRestoredAt(null); };
  return { draft, setDraft, restoredAt, startAgain };
}
