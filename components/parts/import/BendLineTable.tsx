"use client";
import { ArrowDownToLine } from "lucide-react";
import { useState, type KeyboardEvent } from "react";
import type { BendDirection } from "@/bending/part/partDocument";
import { mmPer } from "@/bending/core/units";
import { Choice } from "@/components/ui/Choice";
import { classes } from "@/components/ui/classes";
import { Hint } from "@/components/ui/Hint";
import { formatLength } from "@/lib/format/formatLength";
import type { BendDraft } from "../draft/partDraft";
import { useEditor } from "../editor/editorContext";
import { fieldId } from "../editor/fieldId";
import { PathField } from "../editor/PathField";
import { RowProblems } from "../editor/RowProblems";
import { fillDown, type FillColumn } from "./fillDown";

interface BendLineTableProps {
  /** Index of the line that stands out in the drawing. */
  readonly selected: number | null;
  readonly onSelect: (index: number) => void;
}

const columns: readonly { readonly key: FillColumn; readonly label: string; readonly says: string }[] = [
  { key: "direction", label: "Way", says: "way" }, { key: "angle", label: "Angle", says: "angle" },
  { key: "insideRadius", label: "Radius", says: "inside radius" }, { key: "kFactor", label: "K", says: "K-factor" },
];

/** A flat's bend lines, a row each: way, angle, inside radius and K, with fill-down by button or Ctrl+D. */
export function BendLineTable({ selected, onSelect }: BendLineTableProps) {
  const { draft, update } = useEditor();
  const [said, setSaid] = useState("");
  const lines = draft.flat?.bends ?? [];
  const from = Math.min(selected ?? 0, lines.length - 1);
  const set = (index: number, change: Partial<BendDraft>) => update((old) => ({ ...old, flatBends: old.flatBends.map((row, i) => (i === index ? { ...row, ...change } : row)) }));
  const fill = (column: FillColumn, row: number) => {
    update((old) => ({ ...old, flatBends: fillDown(old.flatBends, column, row) }));
    setSaid(`Copied the ${columns.find(({ key }) => key === column)?.says ?? ""} of ${lines[row]?.id ?? ""} to ${lines.length - 1 - row} lines below.`);
  };
  const onKeyDown = (column: FillColumn, row: number) => (event: KeyboardEvent) => {
    if (event.key.toLowerCase() === "d" && (event.ctrlKey || event.metaKey)) { event.preventDefault(); fill(column, row); }
    if (column === "direction" || (event.key !== "Enter" && event.key !== "ArrowDown" && event.key !== "ArrowUp")) return;
    event.preventDefault();
    document.getElementById(fieldId(`flat.bends[${row + (event.key === "ArrowUp" ? -1 : 1)}].${column}`))?.focus();
  };
  if (lines.length === 0) return <p className="text-ink-soft">No bend line yet. A sheet without bends is cut only.</p>;
  return (
    <div>
      <div className="overflow-x-auto border-y border-ink">
        <table className="w-full border-collapse text-left">
          <caption className="sr-only">Bend lines, lengths in {draft.units}</caption>
          <thead>
            <tr className="border-b border-rule-strong text-sm text-ink-soft">
              <th scope="col" className="px-2 py-1 font-medium">Line</th>
              <th scope="col" className="px-2 py-1 text-right font-medium">Long</th>
              {columns.map(({ key, label, says }) => (
                <th key={key} scope="col" className="px-1 py-1 font-medium">
                  <span className="flex items-center justify-between gap-1">{label}
                    <Hint text={`Copy the ${says} of ${lines[from]?.id ?? ""} to every line below it`}>
                      <button type="button" aria-label={`Copy the ${says} of ${lines[from]?.id ?? ""} to every line below it`} disabled={from >= lines.length - 1} onClick={() => fill(key, from)}
                        className="inline-flex size-7 items-center justify-center rounded border border-transparent hover:border-rule-strong hover:text-ink disabled:opacity-40"><ArrowDownToLine aria-hidden className="size-4" /></button>
                    </Hint>
                  </span>
                </th>
              ))}
            </tr>
          </thead>
          {lines.map((bend, i) => {
            const row = draft.flatBends[i];
            if (row === undefined) return null;
            const at = `flat.bends[${i}]`;
            const [p, q] = bend.line;
            const hem = row.hem !== "none";
            return (
              <tbody key={bend.id} onFocus={() => onSelect(i)} className={classes("border-b border-rule last:border-b-0", i === selected && "bg-accent-wash")}>
                <tr>
                  <th scope="row" className="px-2 py-1 font-medium whitespace-nowrap">
                    <button type="button" id={fieldId(`${at}.line`)} aria-pressed={i === selected} onClick={() => onSelect(i)} className="num underline decoration-rule-strong underline-offset-2 hover:decoration-ink">{bend.id}</button>
                  </th>
                  <td className="num px-2 py-1 text-right whitespace-nowrap">{formatLength(Math.hypot(q[0] - p[0], q[1] - p[1]) * mmPer(draft.units), draft.units, false)}</td>
                  <td className="px-1 py-1" onKeyDown={onKeyDown("direction", i)}>
                    <Choice<BendDirection> label={`Way of ${bend.id}`} labelHidden small value={row.direction} onChange={(direction) => set(i, { direction })} options={[{ value: "up", label: "up" }, { value: "down", label: "down" }]} />
                  </td>
                  <td className="min-w-20 px-1 py-1">{hem ? <span className="text-sm whitespace-nowrap text-ink-soft">{row.hem} hem</span>
                    : <PathField path={`${at}.angle`} label={`Angle of ${bend.id}`} labelHidden kind="angle" value={row.angle} onChange={(angle) => set(i, { angle })} onKeyDown={onKeyDown("angle", i)} />}</td>
                  <td className="min-w-26 px-1 py-1">{hem ? null : <PathField path={`${at}.insideRadius`} label={`Inside radius of ${bend.id}`} labelHidden placeholder="as part" value={row.insideRadius} onChange={(insideRadius) => set(i, { insideRadius })} onKeyDown={onKeyDown("insideRadius", i)} />}</td>
                  <td className="min-w-20 px-1 py-1">{hem ? null : <PathField path={`${at}.kFactor`} label={`K-factor of ${bend.id}`} labelHidden kind="number" placeholder="by rule" value={row.kFactor} onChange={(kFactor) => set(i, { kFactor })} onKeyDown={onKeyDown("kFactor", i)} />}</td>
                </tr>
                <tr><td colSpan={6} className="px-2 empty:hidden"><RowProblems paths={["line", "angle", "insideRadius", "kFactor"].map((field) => `${at}.${field}`)} /></td></tr>
              </tbody>
            );
          })}
        </table>
      </div>
      <p className="mt-1 text-sm text-ink-faint">Enter goes one line down; Ctrl+D copies the field to every line below it.</p>
      <p aria-live="polite" className="sr-only">{said}</p>
    </div>
  );
}
