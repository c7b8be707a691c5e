"use client";
import { ArrowDown, ArrowUp, Check, CircleDashed, GripVertical, OctagonX, SlidersHorizontal, Split } from "lucide-react";
import { useState } from "react";
import type { PlanStep } from "@/bending/plan/planDocument";
import type { FailureReason } from "@/bending/plan/planFailure";
import { classes } from "@/components/ui/classes";
import { IconButton } from "@/components/ui/IconButton";
import { asSentence } from "@/lib/format/asSentence";
import { OwnOrderWishes, type OwnOrderChoices } from "./OwnOrderWishes";
import { stepStateWords, type StepState } from "./stepStates";
import type { DragOrder } from "./useDragOrder";
import type { OwnOrder } from "./useOwnOrder";

interface OwnOrderRowProps {
  readonly own: OwnOrder;
  readonly index: number;
  readonly state: StepState;
  /** What stops the step, when it is the one that fails; the nearest to working first. */
  readonly reasons: readonly FailureReason[];
  /** How the step is made in the best plan along the order, once that is worked out. */
  readonly made: PlanStep | undefined;
  readonly choices: OwnOrderChoices;
  readonly drag: DragOrder;
  readonly onShift: (by: -1 | 1) => void;
}

const signs = { looking: CircleDashed, works: Check, fails: OctagonX, unseen: CircleDashed } as const;
/** Reasons said at the step; the rest is one click away. */
const SAID = 2;

/** One step of the order: where it stands, whether it can be made there, and what is asked of it. */
export function OwnOrderRow({ own, index, state, reasons, made, choices, drag, onShift }: OwnOrderRowProps) {
  const [open, setOpen] = useState(false);
  const entry = own.order[index] ?? "";
  const wish = own.wishes.find(({ bend }) => bend === entry.split("+")[0]);
  const Sign = signs[state];
  const name = entry.split("+").join(" + ");
  return (
    <li ref={drag.rowRef(entry)}
      onKeyDown={(event) => {
        const by = event.key === "ArrowUp" ? -1 : event.key === "ArrowDown" ? 1 : 0;
        if (!event.altKey || by === 0) return;
        event.preventDefault();
        onShift(by);
      }}
      className={classes("border-b border-l-4 border-b-rule", state === "fails" ? "border-l-brick bg-brick-wash" : "border-l-transparent", drag.held === entry && "bg-accent-wash outline-2 -outline-offset-2 outline-accent")}>
      <div className="flex flex-wrap items-center gap-x-2 gap-y-1 py-1 pr-1">
        <button type="button" {...drag.grip(entry)} aria-label={`Move step ${index + 1}, ${name}: drag, or Alt with the arrow keys`}
          className="flex size-9 shrink-0 cursor-grab touch-none items-center justify-center rounded text-ink-faint hover:text-ink active:cursor-grabbing [&_svg]:size-5"><GripVertical aria-hidden /></button>
        <span className="num w-5 text-right font-semibold">{index + 1}</span>
        <span className="min-w-28 flex-1">
          <span className={classes("font-medium", state === "unseen" && "text-ink-soft")}>{name}</span>
          <span className="block text-sm text-ink-soft">{wish ? askedWords(wish) : made ? <>{made.front} in front, <span className="num">{made.punch}</span> on <span className="num">{made.die}</span></> : null}</span>
        </span>
        <span className={classes("flex w-44 items-center gap-1.5 text-sm [&_svg]:size-4 [&_svg]:shrink-0", state === "fails" ? "font-semibold text-brick-ink" : state === "works" ? "text-accent-ink" : "text-ink-soft")}><Sign aria-hidden />{stepStateWords[state]}</span>
        <span className="ml-auto flex items-center">
          {entry.includes("+") ? <IconButton label={`Make ${name} one by one`} onClick={() => own.settle(own.order.flatMap((one) => (one === entry ? one.split("+") : [one])))}><Split aria-hidden /></IconButton> : null}
          <IconButton label={`Front and tools of ${name}`} aria-expanded={open} onClick={() => setOpen(!open)}><SlidersHorizontal aria-hidden /></IconButton>
          <IconButton label={`Move ${name} up`} disabled={index === 0} onClick={() => onShift(-1)}><ArrowUp aria-hidden /></IconButton>
          <IconButton label={`Move ${name} down`} disabled={index + 1 === own.order.length} onClick={() => onShift(1)}><ArrowDown aria-hidden /></IconButton>
        </span>
      </div>
      {open ? <OwnOrderWishes own={own} entry={entry} step={index + 1} wish={wish} choices={choices} /> : null}
      {state === "fails" ? <Reasons reasons={reasons} /> : null}
    </li>
  );
}

function Reasons({ reasons }: { readonly reasons: readonly FailureReason[] }) {
  const lines = reasons.map((reason, at) => <li key={at}>{asSentence(reason.message, [...reason.bends, ...reason.tools])}</li>);
  return (
    <div className="pr-3 pb-2 pl-18 text-sm">
      <ul className="list-disc space-y-1">{lines.slice(0, SAID)}</ul>
      {lines.length > SAID ? <details className="mt-1"><summary className="text-accent-ink">{lines.length - SAID} more in the way</summary><ul className="mt-1 list-disc space-y-1">{lines.slice(SAID)}</ul></details> : null}
    </div>
  );
}

function askedWords({ front, punch, die }: { readonly front?: string; readonly punch?: string; readonly die?: string }): string {
  return `you asked for ${[...(front === undefined ? [] : [`${front} in front`]), ...(punch === undefined ? [] : [punch]), ...(die === undefined ? [] : [die])].join(", ")}`;
}
