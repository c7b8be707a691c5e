import { classes } from "../classes";
import type { Column } from "../DataTable";
import { StateMark, type StateTone } from "../StateMark";
import type { CsvLineFate, LineFate } from "@/lib/schemas/csvImport";

export const fateWords: Readonly<Record<LineFate, { readonly label: string; readonly tone: StateTone }>> = {
  refused: { label: "Refused", tone: "stop" },
  change: { label: "Change", tone: "caution" },
  add: { label: "New", tone: "good" },
  same: { label: "As it is", tone: "off" },
};

export const fateColumns: readonly Column<CsvLineFate>[] = [
  { key: "line", header: "Line", align: "right", className: "num w-16 align-top", cell: ({ line }) => line },
  { key: "label", header: "Entry", rowHeader: true, className: "font-medium align-top whitespace-nowrap", cell: ({ label }) => (label === "" ? "not named" : label) },
  { key: "fate", header: "Fate", className: "align-top", cell: ({ fate }) => <StateMark tone={fateWords[fate].tone}>{fateWords[fate].label}</StateMark> },
  { key: "what", header: "What it would do, or what would be right", className: "w-full min-w-72", cell: (line) => <What line={line} /> },
];

/** Numbers stand in the face of numbers, texts in that of texts. */
const figures = (text: string): string => (/^[-+\d.,\s]+$/.test(text) ? "num" : "");

function What({ line: { fate, changes, problems } }: { readonly line: CsvLineFate }) {
  if (fate === "refused") {
    return (
      <ul>
        {problems.map(({ field, given, message }) => (
          <li key={`${field} ${message}`}>{field === "" ? null : <span className="font-medium">{field} </span>}{given === "" ? null : <span className={classes("text-brick-ink", figures(given))}>“{given}” </span>}{message}</li>
        ))}
      </ul>
    );
  }
  if (fate === "same") return <span className="text-ink-faint">Nothing changes</span>;
  return (
    <ul className="flex flex-wrap gap-x-5">
      {changes.map(({ field, from, to }) => (
        <li key={field}><span className="text-ink-soft">{field}</span> {fate === "add" ? null : <><span className={classes("line-through decoration-ink-faint", figures(from))}>{from === "" ? "empty" : from}</span> <span aria-hidden>→</span><span className="sr-only">becomes</span> </>}<span className={classes("font-medium", figures(to))}>{to === "" ? "empty" : to}</span></li>
      ))}
    </ul>
  );
}
