import { Ban, Check, CircleAlert, CircleDashed, Info, PencilLine, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classes } from "./classes";

export type StateTone = "good" | "wait" | "note" | "caution" | "stop" | "off" | "draft";

const looks = {
  good: { icon: Check, ink: "border-accent text-accent-ink bg-accent-wash" },
  wait: { icon: CircleDashed, ink: "border-steel-400 text-ink-soft" },
  note: { icon: Info, ink: "border-steel-400 text-ink-soft" },
  draft: { icon: PencilLine, ink: "border-steel-400 border-dashed text-ink-soft" },
  caution: { icon: TriangleAlert, ink: "border-amber text-amber-ink bg-amber-wash" },
  stop: { icon: CircleAlert, ink: "border-brick text-brick-ink bg-brick-wash" },
  off: { icon: Ban, ink: "border-steel-400 text-ink-faint" },
} as const;

/** A state as icon and word; colour only adds to them. */
export function StateMark({ tone, children, className }: { readonly tone: StateTone; readonly children: ReactNode; readonly className?: string }) {
  const look = looks[tone];
  return (
    <span className={classes("inline-flex items-center gap-1 rounded border px-1.5 py-px text-sm whitespace-nowrap", look.ink, className)}>
      <look.icon aria-hidden className="size-3.5 shrink-0" />{children}
    </span>
  );
}
