import { z } from "zod";
import { filledText, plainText } from "./plainText";

/** Body of every import: without `confirm` it answers what each line would do and writes nothing. */
export const csvImportSchema = z.strictObject({
  text: z.string({ error: "must be the text of a CSV file" }),
  /** For the record. */
  fileName: plainText(200).default(""),
  confirm: z.strictObject({
    /** The dry run's, to show that the person saw what would be written. */
    digest: filledText(64),
    /** Lines that are refused are left out; else nothing is written as long as there is one. */
    leaveOutRefused: z.boolean().default(false),
  }).optional(),
});

export interface CsvImportInput {
  readonly text: string;
  readonly fileName?: string | undefined;
  readonly confirm?: { readonly digest: string; readonly leaveOutRefused?: boolean | undefined } | undefined;
}

export type LineFate = "add" | "change" | "same" | "refused";

export interface CsvLineFate {
  readonly line: number;
  /** What the line is about, as the shop calls it. */
  readonly label: string;
  readonly fate: LineFate;
  /** Field by field; for a new entry `from` is empty. */
  readonly changes: readonly { readonly field: string; readonly from: string; readonly to: string }[];
  readonly problems: readonly { readonly field: string; readonly given: string; readonly message: string }[];
}

export interface CsvDryRun {
  readonly lines: readonly CsvLineFate[];
  readonly counts: Readonly<Record<LineFate, number>>;
  /** How the file was understood: its separator, its decimals, headings that were left aside. */
  readonly notes: readonly string[];
  readonly digest: string;
}

export interface CsvImportAnswer {
  readonly written: boolean;
  readonly dryRun: CsvDryRun;
}
