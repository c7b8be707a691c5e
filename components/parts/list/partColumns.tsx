import type { Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { flatChangeText } from "@/lib/format/flatChangeText";
import { formatLength } from "@/lib/format/formatLength";
import { formatMoment } from "@/lib/format/formatMoment";
import type { FindingCountsView } from "@/lib/schemas/findingCounts";
import type { PartListItem } from "@/lib/schemas/views";
import { FindingCountsCell } from "../findings/FindingCountsCell";

/** The columns of the list; findings come after it, as they are counted. */
export const partColumns = (findings: FindingCountsView | undefined): readonly Column<PartListItem>[] => [
  { key: "number", header: "Number", sortable: true, className: "whitespace-nowrap", cell: (part) => <span className="num">{part.number}</span> },
  { key: "name", header: "Name", sortable: true, rowHeader: true, cell: (part) => <TextLink href={`/parts/${part.id}`}>{part.name}</TextLink> },
  { key: "material", header: "Material", sortable: true, cell: (part) => part.material },
  { key: "thickness", header: "Thickness", sortable: true, align: "right", cell: (part) => <span className="num whitespace-nowrap">{formatLength(part.thicknessMm, "mm")}</span> },
  { key: "bends", header: "Bends", sortable: true, align: "right", cell: (part) => <span className="num">{part.bends}</span> },
  { key: "flat", header: "Blank", align: "right", cell: (part) => <BlankSize part={part} /> },
  { key: "revision", header: "Revision", sortable: true, align: "right", cell: (part) => <span className="num">{part.revision}</span> },
  { key: "findings", header: "Findings", cell: (part) => <FindingCountsCell counts={findings?.[part.id]} /> },
  { key: "released", header: "Setup sheet", cell: (part) => (part.releasedSheets > 0
    ? <StateMark tone="good">{part.releasedSheets === 1 ? "released" : `${part.releasedSheets} released`}</StateMark>
    : <StateMark tone="wait">none yet</StateMark>) },
  { key: "updatedAt", header: "Changed", sortable: true, cell: (part) => <span className="text-sm"><span className="whitespace-nowrap">{formatMoment(part.updatedAt)}</span><br /><span className="text-ink-faint">{part.updatedBy}</span></span> },
];

/** As stored with the revision, and what it would be now where the shop knows better by this time. */
function BlankSize({ part: { flatWidthMm, flatDepthMm, flatChange } }: { readonly part: PartListItem }) {
  return (
    <>
      <span className="num whitespace-nowrap">{formatLength(flatWidthMm, "mm", false)} × {formatLength(flatDepthMm, "mm")}</span>
      {flatChange === null ? null : <span className="mt-0.5 block"><StateMark tone="caution">now <span className="num">{flatChangeText({ ...flatChange, units: "mm" }).now}</span></StateMark></span>}
    </>
  );
}
