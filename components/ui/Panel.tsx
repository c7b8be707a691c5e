import type { ReactNode } from "react";
import { classes } from "./classes";

interface PanelProps {
  readonly title: ReactNode;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
  readonly className?: string;
}

/** A part of a page under a ruled heading. */
export function Panel({ title, aside, children, className }: PanelProps) {
  return (
    <section className={classes("min-w-0", className)}>
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 border-b border-rule-strong pb-1">
        <h2 className="text-base font-semibold">{title}</h2>
        {aside === undefined ? null : <div className="text-sm text-ink-faint">{aside}</div>}
      </div>
      {children}
    </section>
  );
}
