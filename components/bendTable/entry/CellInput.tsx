import type { ClipboardEvent, KeyboardEvent } from "react";
import { controlClasses } from "@/components/ui/controlClasses";
import { cellId } from "./cellId";
import { fieldWords } from "./fieldWords";
import type { LineField } from "./trialDraft";

interface CellInputProps {
  readonly line: string;
  readonly number: number;
  readonly field: LineField;
  readonly value: string;
  readonly wrong: boolean;
  readonly onText: (text: string) => void;
  readonly onKeys: (event: KeyboardEvent<HTMLInputElement>) => void;
  readonly onPaste: (event: ClipboardEvent<HTMLInputElement>) => void;
}

const words: ReadonlySet<LineField> = new Set(["material", "batch", "note"]);

/** One cell of the notebook: a text box without a frame of its own to spare room. */
export function CellInput({ line, number, field, value, wrong, onText, onKeys, onPaste }: CellInputProps) {
  const id = cellId(line, field);
  const text = words.has(field);
  return (
    <input id={id} type="text" inputMode="text" autoComplete="off" spellCheck={false} aria-label={`${fieldWords[field]}, line ${number}`}
      {...(field === "material" ? { list: "trial-materials" } : {})} aria-invalid={wrong || undefined} aria-describedby={wrong ? `${id}-error` : undefined}
      value={value} onChange={(event) => onText(event.target.value)} onKeyDown={onKeys} onPaste={onPaste} onFocus={(event) => event.target.select()}
      className={controlClasses(wrong, text ? "min-h-8 px-1.5" : "num min-h-8 px-1.5 text-right")} />
  );
}
