"use client";
import { Trash2 } from "lucide-react";
import { memo, useMemo, type ClipboardEvent, type KeyboardEvent } from "react";
import { IconButton } from "@/components/ui/IconButton";
import { cellId } from "./cellId";
import { CellInput } from "./CellInput";
import { LineNumbers } from "./LineNumbers";
import { readRow, type RowContext } from "./readRow";
import type { LineProblems } from "./readTrialLine";
import { standingNominal } from "./standingNominal";
import { lineFields, type LineField, type TrialLine } from "./trialDraft";

export interface RowActions {
  readonly text: (line: string, field: LineField, text: string) => void;
  readonly keys: (line: string, field: LineField, event: KeyboardEvent<HTMLInputElement>) => void;
  readonly paste: (line: string, field: LineField, event: ClipboardEvent<HTMLInputElement>) => void;
  readonly remove: (line: string) => void;
}

interface TrialRowProps {
  readonly line: TrialLine;
  readonly number: number;
  readonly context: RowContext;
  /** What the server said of this line. */
  readonly refused: LineProblems | undefined;
  /** Saving was tried: empty fields are mistakes from now on. */
  readonly tried: boolean;
  readonly only: boolean;
  readonly actions: RowActions;
}

/** One line of the notebook with what comes of it, and under it what is wrong with it. */
export const TrialRow = memo(function TrialRow({ line, number, context, refused, tried, only, actions }: TrialRowProps) {
  const read = useMemo(() => readRow(line, context), [line, context]);
  const standing = standingNominal(line, context.head.units, context.materials);
  const problems: LineProblems = { ...read.problems, ...refused };
  const wrong = lineFields.filter((field) => problems[field] !== undefined && (tried || line[field].trim() !== ""));
  return (
    <>
      <tr className="border-t border-rule">
        <th scope="row" className="num px-2 text-right font-normal text-ink-faint">{number}</th>
        {lineFields.map((field) => (
          <td key={field} className="p-0.5">
            <CellInput line={line.id} number={number} field={field} value={line[field]} wrong={wrong.includes(field)} {...(field === "nominal" && standing !== null ? { standing } : {})}
              onText={(text) => actions.text(line.id, field, text)} onKeys={(event) => actions.keys(line.id, field, event)} onPaste={(event) => actions.paste(line.id, field, event)} />
          </td>
        ))}
        <LineNumbers result={read.result} units={context.head.units} />
        <td className="px-1"><IconButton label={`Remove line ${number}`} danger disabled={only} onClick={() => actions.remove(line.id)}><Trash2 aria-hidden /></IconButton></td>
      </tr>
      {wrong.length === 0 ? null : (
        <tr>
          <td />
          <td colSpan={lineFields.length + 5} className="px-2 pb-1.5">
            <ul className="flex flex-wrap gap-x-6 gap-y-0.5 text-sm text-brick-ink">
              {wrong.map((field) => <li key={field} id={`${cellId(line.id, field)}-error`}>{problems[field]}</li>)}
            </ul>
          </td>
        </tr>
      )}
    </>
  );
});
