import { Panel } from "@/components/ui/Panel";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatMoment } from "@/lib/format/formatMoment";
import type { PartDetail } from "@/lib/schemas/views";

/** Every saved state of the part, newest first. */
export function Revisions({ part }: { readonly part: PartDetail }) {
  return (
    <Panel title="Revisions" aside={part.revisions.length < 2 ? undefined : <TextLink href={`/parts/${part.id}/compare`}>Compare two</TextLink>}>
      <ol className="border-t border-rule">
        {part.revisions.map((revision) => (
          <li key={revision.id} className="flex flex-wrap items-baseline gap-x-4 border-b border-rule py-1.5">
            <span className="num w-6 text-right font-medium">{revision.revision}</span>
            <span className="min-w-0 grow break-words">
              <TextLink href={`/parts/${part.id}?revision=${revision.revision}`} aria-label={`Show revision ${revision.revision}`}>{revision.note === "" ? "no note" : revision.note}</TextLink>
            </span>
            {revision.id === part.revision.id ? <StateMark tone="note">shown here</StateMark> : null}
            <span className="text-sm text-ink-faint">{revision.createdBy}, {formatMoment(revision.createdAt)}</span>
          </li>
        ))}
      </ol>
    </Panel>
  );
}
