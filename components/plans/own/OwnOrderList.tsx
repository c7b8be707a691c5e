"use client";
import { ArrowDown, ArrowUp, Check, CircleDashed, GripVertical, OctagonX, Repeat2, Split } from "lucide-react";
import type { KeyboardEvent } from "react";
import { classes } from "@/components/ui/classes";
import { IconButton } from "@/components/ui/IconButton";
import { Select, type SelectOption } from "@/components/ui/Select";
import { asSentence } from "@/lib/format/asSentence";
import type { FailureReason } from "@/bending/plan/planFailure";
import { moved } from "./moved";
import { stepStateWords, type StepState } from "./stepStates";
import { useDragOrder } from "./useDragOrder";
import type { OwnOrder } from "./useOwnOrder";

export interface OwnOrderChoices {
  /** The two faces that may be in front when a stroke is made. */
  readonly fronts: (entry: string) => readonly string[];
  readonly punches: readonly SelectOption[];
  readonly dies: readonly SelectOption[];
}

interface OwnOrderListProps {
  readonly own: OwnOrder;
  readonly states: readonly StepState[];
  /** What stops the step that fails, the nearest to working first. */
  readonly reasons: readonly FailureReason[];
  readonly choices: OwnOrderChoices;
}

const signs = { looking: CircleDashed, works: Check, fails: OctagonX, unseen: CircleDashed } as const;
const ANY = "any";

/** The steps, to be put in another order by dragging, by buttons or by Alt with the arrow keys; what is wrong is said at the step where it is wrong. */
export function OwnOrderList({ own, states, reasons, choices }: OwnOrderListProps) {
  const drag = useDragOrder(own.order, own.preview, own.settle);
  const shift = (index: number, by: -1 | 1): void => own.settle(moved(own.order, index, index + by));
  const onKey = (event: KeyboardEvent, index: number): void => {
    const by = event.key === "ArrowUp" ? -1 : event.key === "ArrowDown" ? 1 : 0;
    if (!event.altKey || by === 0) return;
    event.preventDefault();
    shift(index, by);
  };
  return (
    <ol aria-label="Your order" className="border-t border-ink">
      {own.order.map((entry, index) => {
        const state = states[index] ?? "unseen";
        const Sign = signs[state];
        const wish = own.wishes.find(({ bend }) => bend === entry.split("+")[0]);
        return (
          <li key={entry} ref={drag.rowRef(entry)} onKeyDown={(event) => onKey(event, index)}
            className={classes("border-b border-rule border-l-4", state === "fails" ? "border-l-brick bg-brick-wash" : state === "unseen" ? "border-l-transparent text-ink-faint" : "border-l-transparent", drag.held === entry && "outline-2 outline-accent")}>
            <div className="flex flex-wrap items-center gap-x-3 gap-y-1 py-1.5 pr-1">
              <button type="button" {...drag.grip(entry)} aria-label={`Move step ${index + 1}, ${entry}: drag, or Alt with the arrow keys`} className="flex size-9 shrink-0 cursor-grab touch-none items-center justify-center rounded text-ink-faint hover:text-ink active:cursor-grabbing [&_svg]:size-5"><GripVertical aria-hidden /></button>
              <span className="num w-6 text-right font-semibold">{index + 1}</span>
              <span className="min-w-28 grow font-medium">{entry.split("+").join(" + ")}</span>
              <span className={classes("flex min-w-40 items-center gap-1.5 text-sm [&_svg]:size-4", state === "fails" ? "font-semibold text-brick-ink" : state === "works" ? "text-accent-ink" : "text-ink-faint")}><Sign aria-hidden />{stepStateWords[state]}</span>
              <span className="flex items-center">
                {entry.includes("+") ? <IconButton label={`Make ${entry} one by one`} onClick={() => own.settle(own.order.flatMap((one) => (one === entry ? one.split("+") : [one])))}><Split aria-hidden /></IconButton> : null}
                <IconButton label={`Move ${entry} up`} disabled={index === 0} onClick={() => shift(index, -1)}><ArrowUp aria-hidden /></IconButton>
                <IconButton label={`Move ${entry} down`} disabled={index + 1 === own.order.length} onClick={() => shift(index, 1)}><ArrowDown aria-hidden /></IconButton>
              </span>
            </div>
            <div className="flex flex-wrap items-center gap-2 pb-2 pl-14">
              <FrontChoice fronts={choices.fronts(entry)} chosen={wish?.front} onChoose={(front) => own.wish(entry, { front })} />
              <Select id={`own-punch-${index}`} label={`Punch of step ${index + 1}`} labelHidden className="w-44" value={wish?.punch ?? ANY} onChange={(value) => own.wish(entry, { punch: value === ANY ? undefined : value })} options={[{ value: ANY, label: "any punch" }, ...choices.punches]} />
              <Select id={`own-die-${index}`} label={`Die of step ${index + 1}`} labelHidden className="w-44" value={wish?.die ?? ANY} onChange={(value) => own.wish(entry, { die: value === ANY ? undefined : value })} options={[{ value: ANY, label: "any die" }, ...choices.dies]} />
            </div>
            {state === "fails" ? <ul className="space-y-1 pr-3 pb-3 pl-14 text-sm text-ink">{reasons.map((reason, at) => <li key={at}>{asSentence(reason.message, [...reason.bends, ...reason.tools])}</li>)}</ul> : null}
          </li>
        );
      })}
    </ol>
  );
}

/** Whichever front is best, or one of the two: pressed again it goes to the next. */
function FrontChoice({ fronts, chosen, onChoose }: { readonly fronts: readonly string[]; readonly chosen: string | undefined; readonly onChoose: (front: string | undefined) => void }) {
  const all = [undefined, ...fronts];
  const next = all[(all.indexOf(chosen) + 1) % all.length];
  return (
    <button type="button" onClick={() => onChoose(next)} className="inline-flex min-h-10 items-center gap-2 rounded border border-rule-strong bg-sheet px-3 text-sm hover:border-ink [&_svg]:size-4">
      <Repeat2 aria-hidden />{chosen === undefined ? "either side in front" : <><span className="font-medium">{chosen}</span> in front</>}
    </button>
  );
}
