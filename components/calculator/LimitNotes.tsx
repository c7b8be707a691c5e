import type { LengthUnit } from "@/bending/core/units";
import { StateMark } from "@/components/ui/StateMark";
import type { DieLimit, ForceLimit } from "@/lib/calculator/shopLimits";
import { formatQuantity } from "@/lib/format/formatQuantity";

interface LimitNotesProps {
  readonly brakes: readonly ForceLimit[];
  readonly punches: readonly ForceLimit[];
  readonly dies: readonly DieLimit[];
  /** kN for the V asked about. */
  readonly needed: number;
  readonly units: LengthUnit;
  /** Tools that were not fetched. */
  readonly more: number;
}

/** What the shop's brakes and tools bear, with word and sign; those over the chart's top stand here alone. */
export function LimitNotes({ brakes, punches, dies, needed, units, more }: LimitNotesProps) {
  const said = (force: number) => <span className="num">{formatQuantity(force, "force", units)}</span>;
  if (brakes.length + punches.length + dies.length === 0) return null;
  const mark = (enough: boolean) => (enough ? <StateMark tone="good">bears it</StateMark> : <StateMark tone="stop">too weak</StateMark>);
  const lists = [
    { title: "Brakes, for this V", rows: brakes.map(({ name, most }) => ({ name, most, enough: most >= needed, size: null })) },
    { title: "Dies over this length, each for its own V", rows: dies.map(({ name, bears, needs, vOpening }) => ({ name, most: bears, enough: bears >= needs, size: `V ${formatQuantity(vOpening, "length", units)}` })) },
    { title: "Punches over this length, for this V", rows: punches.map(({ name, most }) => ({ name, most, enough: most >= needed, size: null })) },
  ].filter(({ rows }) => rows.length > 0);
  return (
    <div className="mt-3 grid grid-cols-[repeat(auto-fill,minmax(17rem,1fr))] gap-x-8 gap-y-3">
      {lists.map(({ title, rows }) => (
        <div key={title}>
          <h3 className="caption">{title}</h3>
          <ul className="max-h-56 overflow-y-auto" tabIndex={0} aria-label={title}>
            {rows.map((row) => <li key={row.name} className="flex flex-wrap items-center gap-x-3 border-b border-rule py-1"><span className="grow">{row.name}{row.size === null ? null : <span className="num text-ink-faint"> {row.size}</span>}</span>{said(row.most)}{mark(row.enough)}</li>)}
          </ul>
        </div>
      ))}
      {more > 0 ? <p className="text-sm text-ink-faint">{more} more tools are not drawn; those rated least are.</p> : null}
    </div>
  );
}
