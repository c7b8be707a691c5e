"use client";
import { useState } from "react";
import { ImportFates } from "./ImportFates";
import { ImportSource, type ImportText } from "./ImportSource";
import { Notice } from "../Notice";
import type { ColumnNote } from "@/lib/csv/columnNotes";
import type { CsvDryRun, CsvImportAnswer, CsvImportInput } from "@/lib/schemas/csvImport";

interface ImportTableProps {
  /** What the lines are, in the plural: "materials". */
  readonly what: string;
  readonly columns: readonly ColumnNote[];
  /** Asks the server: a dry run without `confirm`, the writing with it. Throws what is to be shown. */
  readonly run: (input: CsvImportInput) => Promise<CsvImportAnswer>;
  readonly onWritten: (dryRun: CsvDryRun) => void;
  readonly onCancel?: () => void;
}

/** A table is given, every line's fate is shown, and only a confirmation writes. What was given stays until then. */
export function ImportTable({ what, columns, run, onWritten, onCancel }: ImportTableProps) {
  const [source, setSource] = useState<ImportText>({ text: "", fileName: "" });
  const [dryRun, setDryRun] = useState<CsvDryRun | null>(null);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  const ask = async (given: ImportText, confirm?: CsvImportInput["confirm"]) => {
    setBusy(true);
    setProblem(null);
    try {
      const answer = await run({ text: given.text, fileName: given.fileName, ...(confirm === undefined ? {} : { confirm }) });
      if (answer.written) onWritten(answer.dryRun);
      else setDryRun(answer.dryRun);
    } catch (thrown) {
      setProblem(thrown instanceof Error ? thrown.message : "The server cannot be reached.");
    } finally {
      setBusy(false);
    }
  };
  const give = (given: ImportText) => { setSource(given); setDryRun(null); setProblem(null); };

  return (
    <div className="space-y-4">
      {problem === null ? null : <Notice tone="wrong" title={dryRun === null ? "Nothing was read" : "Nothing was written"} live>{problem}</Notice>}
      {dryRun === null
        ? <ImportSource what={what} columns={columns} source={source} busy={busy} onChange={give} onAsk={(given) => { setSource(given); void ask(given); }} {...(onCancel === undefined ? {} : { onCancel })} />
        : (
          <ImportFates key={dryRun.digest} what={what} dryRun={dryRun} busy={busy} {...(source.note === undefined ? {} : { note: source.note })} onBack={() => { setDryRun(null); setProblem(null); }}
            onAgain={() => void ask(source)} stale={problem !== null} onConfirm={(leaveOutRefused) => void ask(source, { digest: dryRun.digest, leaveOutRefused })} />
        )}
    </div>
  );
}
