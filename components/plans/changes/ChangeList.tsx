import type { ReactNode } from "react";
import type { ChangeAmount, ChangeGroup, PlanChange } from "@/bending/plan/planChange";
import { EmptyState } from "@/components/ui/EmptyState";
import { asSentence } from "@/lib/format/asSentence";
import { formatNumber } from "@/lib/format/formatNumber";

interface ChangeListProps {
  readonly changes: readonly PlanChange[];
  readonly complete: boolean;
  /** What can be done with a change at once. */
  readonly act?: (change: PlanChange) => ReactNode;
}

const groups: Record<ChangeGroup, string> = { order: "Another order", stock: "More pieces", tool: "Another tool", machine: "Another brake", part: "The part", setting: "A setting" };

/** The least changes that would work, the cheapest kind first: how much, what comes of it, and how it is known to be the least. */
export function ChangeList({ changes, complete, act }: ChangeListProps) {
  if (changes.length === 0) {
    return <EmptyState title="No single change was found that would do">{complete ? "Orders, pieces, tools, brake, flanges and settings were each tried by themselves. It takes more than one of them." : "The time ended before every kind of change was tried. Try again when the server is less busy."}</EmptyState>;
  }
  return (
    <>
      <div className="overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label="Changes that would make it work">
        <table className="w-full border-collapse text-left text-sm">
          <thead><tr className="border-b border-rule-strong">{["What", "Change", "At least", "Known because"].map((head) => <th key={head} scope="col" className="px-2 py-1.5 font-medium text-ink-soft first:pl-0">{head}</th>)}</tr></thead>
          <tbody>
            {changes.map((change, index) => (
              <tr key={index} className="border-b border-rule align-top last:border-b-0">
                <th scope="row" className="py-2 pr-2 font-medium whitespace-nowrap">{groups[change.group]}</th>
                <td className="min-w-64 px-2 py-2"><p>{asSentence(change.message, [...(change.what.bends ?? []), ...(change.what.faces ?? []), ...(change.what.tools ?? [])])}</p>{act?.(change)}</td>
                <td className="num px-2 py-2 whitespace-nowrap">{change.amount === null ? "–" : [change.amount, ...change.with].map((amount) => <span key={amount.name} className="block">{amountText(amount)}</span>)}</td>
                <td className="min-w-48 px-2 py-2 text-ink-soft">{proofWords(change)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {complete ? null : <p className="mt-2 text-sm text-ink-soft">The time ended before every kind of change was tried.</p>}
    </>
  );
}

const units: Partial<Record<ChangeAmount["unit"], string>> = { deg: "°" };

function amountText({ value, unit, from }: ChangeAmount): string {
  const say = (number: number): string => `${formatNumber(number, unit === "in" ? 3 : 2)}${units[unit] ?? ` ${unit}`}`;
  return from === undefined ? say(value) : `${say(value)}, now ${say(from)}`;
}

function proofWords({ found, amount, plan }: PlanChange): string {
  const unit = amount === null ? "" : units[amount.unit] ?? ` ${amount.unit}`;
  const less = found.notEnough === undefined || amount === null ? "" : `; ${formatNumber(found.notEnough, 3)}${unit} is not enough`;
  return `it was planned with it${plan.status === "optimal" ? ", proven best" : ""}${less}`;
}
