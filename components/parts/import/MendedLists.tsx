"use client";
import type { ReactNode } from "react";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { FoundFlat } from "@/bending/exchange/dxf/import/foundFlat";
import type { DrawingFacts } from "./drawingMessages";

interface MendedListsProps {
  readonly flat: FoundFlat;
  readonly facts: DrawingFacts;
  readonly onPlace: (place: Vec2) => void;
}

const SHOWN = 100;

/** What was mended, what is left over and what could not be read; each place leads to the drawing. */
export function MendedLists({ flat, facts, onPlace }: MendedListsProps) {
  const { repairs, leftovers } = flat;
  return (
    <div className="space-y-3">
      <PlaceList title="Mended" none="Nothing had to be mended." entries={repairs.map(({ message, at }) => ({ says: message, at }))} onPlace={onPlace} />
      {leftovers.length === 0 ? null : <PlaceList title="Left over" none="" entries={leftovers.map(({ what, at }) => ({ says: what, at }))} onPlace={onPlace} />}
      {facts.notes.length === 0 ? null : (
        <Listed title="Not read" count={facts.notes.length + facts.moreNotes}>
          {facts.notes.slice(0, SHOWN).map(({ line, message }) => <li key={`${line} ${message}`} className="py-0.5">Line <span className="num">{line}</span>: {message}</li>)}
        </Listed>
      )}
    </div>
  );
}

function PlaceList({ title, none, entries, onPlace }: { readonly title: string; readonly none: string; readonly entries: readonly { readonly says: string; readonly at: Vec2 }[]; readonly onPlace: (place: Vec2) => void }) {
  if (entries.length === 0) return <p className="text-ink-soft">{none}</p>;
  return (
    <Listed title={title} count={entries.length}>
      {entries.slice(0, SHOWN).map(({ says, at }, i) => (
        <li key={i}><button type="button" onClick={() => onPlace(at)} className="py-0.5 text-left underline decoration-rule-strong underline-offset-2 hover:decoration-ink">{says.charAt(0).toUpperCase() + says.slice(1)}</button></li>
      ))}
      {entries.length > SHOWN ? <li>and {entries.length - SHOWN} more</li> : null}
    </Listed>
  );
}

function Listed({ title, count, children }: { readonly title: string; readonly count: number; readonly children: ReactNode }) {
  return (
    <details open={count <= 8} className="border-y border-rule py-1">
      <summary className="cursor-pointer font-medium">{title} <span className="num font-normal text-ink-soft">{count}</span></summary>
      <ul className="mt-1 max-h-48 overflow-y-auto text-sm">{children}</ul>
    </details>
  );
}
