"use client";
import { Search, X } from "lucide-react";
import { useEffect, useEffectEvent, useState } from "react";

interface FilterBoxProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
}

/** A search box that asks once typing has paused, or when it is left: a link that is followed at once is not overtaken. */
export function FilterBox({ label, value, onChange }: FilterBoxProps) {
  const [text, setText] = useState(value);
  const [asked, setAsked] = useState(value);
  const [seen, setSeen] = useState(value);
  if (value !== seen) {
    setSeen(value);
    // Changed from elsewhere: by "show all", or by going back.
    if (value !== asked) { setAsked(value); setText(value); }
  }
  const ask = useEffectEvent((next: string) => { setAsked(next); onChange(next); });
  useEffect(() => {
    if (text === asked) return undefined;
    const timer = setTimeout(() => ask(text), 250);
    return () => clearTimeout(timer);
  }, [text, asked]);
  return (
    <div className="relative w-72 max-w-full" role="search">
      <Search aria-hidden className="pointer-events-none absolute top-1/2 left-3 size-4 -translate-y-1/2 text-ink-faint" />
      <input type="search" aria-label={label} placeholder={label} value={text} onChange={(event) => setText(event.target.value)} onBlur={() => { if (text !== asked) { setAsked(text); onChange(text); } }}
        className="min-h-10 w-full rounded border border-rule-strong bg-sheet pr-9 pl-9 placeholder:text-ink-faint hover:border-ink-soft [&::-webkit-search-cancel-button]:hidden" />
      {text === "" ? null : (
        <button type="button" aria-label="Clear the search" onClick={() => { setText(""); setAsked(""); onChange(""); }} className="absolute inset-y-0 right-1 flex w-8 items-center justify-center text-ink-soft hover:text-ink">
          <X aria-hidden className="size-4" />
        </button>
      )}
    </div>
  );
}
