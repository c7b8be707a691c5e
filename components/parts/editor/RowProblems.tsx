"use client";
import { CircleAlert } from "lucide-react";
import { useEditor } from "./editorContext";

/** What is wrong in a row of fields, under the row, where there is room for it; each field says its own to screen readers. */
export function RowProblems({ paths }: { readonly paths: readonly string[] }) {
  const { problemAt } = useEditor();
  const found = paths.flatMap((path) => { const message = problemAt(path); return message === undefined ? [] : [{ path, message }]; });
  return found.map(({ path, message }) => (
    <p key={path} aria-hidden className="mt-1 flex items-start gap-1.5 text-sm text-brick-ink"><CircleAlert className="mt-0.5 size-4 shrink-0" />{message}</p>
  ));
}
