import { CircleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classes } from "./classes";

export interface FieldFrame {
  /** Also the id of the control: the label, hint and error are tied to it. */
  readonly id: string;
  readonly label: string;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  /** The label is read out but not drawn (inside tables, where the column head says it). */
  readonly labelHidden?: boolean;
  /** The error is read out but drawn elsewhere (under its row, where there is room for it). */
  readonly errorHidden?: boolean;
  readonly className?: string | undefined;
}

/** Props that tie a control to its hint and error. */
export function describedBy({ id, hint, error }: Pick<FieldFrame, "id" | "hint" | "error">) {
  const ids = [hint === undefined ? null : `${id}-hint`, error === undefined ? null : `${id}-error`].filter((name) => name !== null);
  return { "aria-describedby": ids.length === 0 ? undefined : ids.join(" "), "aria-invalid": error === undefined ? undefined : true } as const;
}

export function Field({ id, label, hint, error, labelHidden = false, errorHidden = false, className, children }: FieldFrame & { readonly children: ReactNode }) {
  return (
    <div className={classes("min-w-0", className)}>
      <label htmlFor={id} className={labelHidden ? "sr-only" : "mb-1 block text-sm font-medium text-ink-soft"}>{label}</label>
      {children}
      {hint === undefined ? null : <p id={`${id}-hint`} className="mt-1 text-sm text-ink-faint">{hint}</p>}
      {error === undefined ? null : (
        <p id={`${id}-error`} className={errorHidden ? "sr-only" : "mt-1 flex items-start gap-1.5 text-sm text-brick-ink"}>
          <CircleAlert aria-hidden className="mt-0.5 size-4 shrink-0" /><span className="min-w-0 break-words">{error}</span>
        </p>
      )}
    </div>
  );
}
