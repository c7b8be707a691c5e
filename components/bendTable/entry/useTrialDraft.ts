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

/** The trials being typed, kept in this browser for this person until they are saved or thrown away. */
export function useTrialDraft(person: string, start: () => TrialDraft) {
  const key = `foldwright.bend-trials.${version}.${person}`;
  const [begun] = useState(() => ({ stored: read(key), start: start() }));
  const [draft, setDraft] = useState(begun.stored?.draft ?? begun.start);
  const [restoredAt, setRestoredAt] = useState(begun.stored !== null && begun.stored.draft.lines.some((line) => !isBlankLine(line)) ? begun.stored.savedAt : null);
  const changed = draft !== begun.start;
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
