"use client";
import { Search, X } from "lucide-react";
import { useEffect, useState } from "react";

interface FilterBoxProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
}

/** A search box that asks once typing has paused. */
export function FilterBox({ label, value, onChange }: FilterBoxProps) {
  const [text, setText] = useState(value);
  useEffect(() => {
    if (text === value) return undefined;
    const timer = setTimeout(() => onChange(text), 250);
    return () => clearTimeout(timer);
  }, [text, value, onChange]);
  return (
    <div className="relative w-72 max-w-full" role="search">
      <Search aria-hidden className="pointer-events-none absolute top-1/2 left-3 size-4 -translate-y-1/2 text-ink-faint" />
      <input type="search" aria-label={label} placeholder={label} value={text} onChange={(event) => setText(event.target.value)}
        className="min-h-10 w-full rounded border border-rule-strong bg-sheet pr-9 pl-9 placeholder:text-ink-faint hover:border-ink-soft [&::-webkit-search-cancel-button]:hidden" />
      {text === "" ? null : (
        <button type="button" aria-label="Clear the search" onClick={() => { setText(""); onChange(""); }} className="absolute inset-y-0 right-1 flex w-8 items-center justify-center text-ink-soft hover:text-ink">
          <X aria-hidden className="size-4" />
        </button>
      )}
    </div>
  );
}
