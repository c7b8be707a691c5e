import type { ClipboardEvent, KeyboardEvent } from "react";
import { classes } from "@/components/ui/classes";
import { cellId } from "./cellId";
import { fieldWords } from "./fieldWords";
import type { LineField } from "./trialDraft";

interface CellInputProps {
  readonly line: string;
  readonly number: number;
  readonly field: LineField;
  readonly value: string;
  readonly wrong: boolean;
  /** What holds while it is empty. */
  readonly standing?: string;
  readonly onText: (text: string) => void;
  readonly onKeys: (event: KeyboardEvent<HTMLInputElement>) => void;
  readonly onPaste: (event: ClipboardEvent<HTMLInputElement>) => void;
}

const words: ReadonlySet<LineField> = new Set(["material", "batch", "note"]);

/** One cell of the notebook: a narrow text box, so that a whole line is in sight. */
export function CellInput({ line, number, field, value, wrong, standing, onText, onKeys, onPaste }: CellInputProps) {
  const id = cellId(line, field);
  const text = words.has(field);
  return (
    <input id={id} type="text" inputMode="text" autoComplete="off" spellCheck={false} aria-label={`${fieldWords[field]}, line ${number}`}
      {...(field === "material" ? { list: "trial-materials" } : {})} aria-invalid={wrong || undefined} aria-describedby={wrong ? `${id}-error` : undefined}
      value={value} placeholder={standing} onChange={(event) => onText(event.target.value)} onKeyDown={onKeys} onPaste={onPaste} onFocus={(event) => event.target.select()}
      className={classes("min-h-8 w-full rounded border bg-sheet px-1.5 text-ink placeholder:text-ink-faint focus-visible:outline-2 focus-visible:-outline-offset-1",
        wrong ? "border-brick outline-brick" : "border-rule-strong hover:border-ink-soft", !text && "num text-right")} />
  );
}
