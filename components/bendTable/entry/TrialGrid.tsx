"use client";
import type { MaterialFacts } from "@/bending/handbook/material";
import { fieldWords } from "./fieldWords";
import type { RowContext } from "./readRow";
import type { LineProblems } from "./readTrialLine";
import { lineFields, type LineField, type TrialLine } from "./trialDraft";
import { TrialRow, type RowActions } from "./TrialRow";

interface TrialGridProps {
  readonly lines: readonly TrialLine[];
  readonly context: RowContext;
  /** Those that are offered while a material is typed. */
  readonly offered: readonly Pick<MaterialFacts, "id" | "name">[];
  readonly refused: ReadonlyMap<string, LineProblems>;
  readonly tried: boolean;
  readonly actions: RowActions;
}

const widths: Readonly<Record<LineField, string>> = {
  material: "w-28", batch: "w-24", nominal: "w-20", thickness: "w-20", vOpening: "w-20", punchRadius: "w-18", angle: "w-18", blank: "w-22", flangeA: "w-22", flangeB: "w-22",
  insideRadius: "w-20", note: "w-28",
};
const words = new Set<LineField>(["material", "batch", "note"]);

/** The notebook: a line for each trial, what comes of it at the right. */
export function TrialGrid({ lines, context, offered, refused, tried, actions }: TrialGridProps) {
  const { units, angles } = context.head;
  const unitOf = (field: LineField) => (words.has(field) ? "" : field === "angle" ? (angles === "turned" ? "° turned" : "° incl.") : units);
  const head = "px-1.5 pb-1 align-bottom text-sm leading-tight font-medium text-ink-soft";
  return (
    <div className="relative max-h-[75dvh] overflow-auto border-y border-ink" tabIndex={0} role="region" aria-label="Trials">
      <table className="w-full min-w-330 border-collapse text-left">
        <caption className="sr-only">Trials: one line for each bend, with what comes of it</caption>
        <thead className="sticky top-0 z-10 bg-paper">
          <tr>
            <th scope="col" className={head}><span className="sr-only">Line</span></th>
            {lineFields.map((field) => (
              <th key={field} scope="col" className={`${head} ${widths[field]} ${words.has(field) ? "" : "text-right"}`}>{fieldWords[field]} <span className="block text-xs font-normal text-ink-faint">{unitOf(field) || "\u00a0"}</span></th>
            ))}
            {["Deduction", "Handbook", "K", "Radius"].map((name) => <th key={name} scope="col" className={`${head} text-right`}>{name} <span className="block text-xs font-normal text-ink-faint">{name === "K" ? "\u00a0" : units}</span></th>)}
            <th scope="col" className={head}><span className="sr-only">Remove</span></th>
          </tr>
        </thead>
        <tbody>
          {lines.map((line, index) => (
            <TrialRow key={line.id} line={line} number={index + 1} context={context} refused={refused.get(line.id)} tried={tried} only={lines.length === 1} actions={actions} />
          ))}
        </tbody>
      </table>
      <datalist id="trial-materials">{offered.map(({ id, name }) => <option key={id} value={id}>{name}</option>)}</datalist>
    </div>
  );
}
