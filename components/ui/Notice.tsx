import { CircleAlert, CircleCheck, Info, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classes } from "./classes";

const looks = {
  good: { icon: CircleCheck, edge: "border-l-accent", ink: "text-accent-ink" },
  note: { icon: Info, edge: "border-l-steel-500", ink: "text-ink-soft" },
  caution: { icon: TriangleAlert, edge: "border-l-amber", ink: "text-amber-ink" },
  wrong: { icon: CircleAlert, edge: "border-l-brick", ink: "text-brick-ink" },
} as const;

interface NoticeProps {
  readonly tone: keyof typeof looks;
  readonly title: ReactNode;
  readonly children?: ReactNode;
  /** Spoken at once by screen readers (for answers to what was just done). */
  readonly live?: boolean;
}

/** A message that belongs to the page: what happened, and what to do about it. */
export function Notice({ tone, title, children, live = false }: NoticeProps) {
  const look = looks[tone];
  return (
    <div role={live ? "alert" : undefined} className={classes("flex items-start gap-3 border border-l-4 border-rule bg-sheet p-3", look.edge)}>
      <look.icon aria-hidden className={classes("mt-0.5 size-5 shrink-0", look.ink)} />
      <div className="min-w-0">
        <p className="font-semibold">{title}</p>
        {children === undefined ? null : <div className="mt-0.5 space-y-1 text-ink-soft break-words">{children}</div>}
      </div>
    </div>
  );
}
