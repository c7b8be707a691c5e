import type { Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";
import { formatNumber } from "@/lib/format/formatNumber";
import type { ToolListItem } from "@/lib/schemas/views";

const length = (value: number) => <span className="num">{formatLength(value, "mm", false)}</span>;

export const toolColumns: readonly Column<ToolListItem>[] = [
  { key: "code", header: "Code", sortable: true, rowHeader: true, className: "whitespace-nowrap", cell: (tool) => <TextLink href={`/tools/${encodeURIComponent(tool.code)}`}>{tool.code}</TextLink> },
  { key: "kind", header: "Kind", sortable: true, cell: (tool) => tool.kind },
  { key: "name", header: "Name", sortable: true, cell: (tool) => tool.name },
  { key: "angle", header: "Angle", sortable: true, align: "right", cell: (tool) => <span className="num">{formatAngle(tool.angleDeg)}</span> },
  { key: "radius", header: "Radius", sortable: true, align: "right", cell: (tool) => length(tool.radiusMm) },
  { key: "vOpening", header: "V", sortable: true, align: "right", cell: (tool) => (tool.vOpeningMm === null ? <span className="text-ink-faint">–</span> : length(tool.vOpeningMm)) },
  { key: "height", header: "Height", sortable: true, align: "right", cell: (tool) => length(tool.heightMm) },
  { key: "maxForce", header: "kN/m", sortable: true, align: "right", cell: (tool) => <span className="num">{formatNumber(tool.maxForcePerMetreKN, 0)}</span> },
  { key: "lengthInService", header: "In service, mm", sortable: true, align: "right", cell: (tool) => length(tool.lengthInServiceMm) },
  { key: "pieces", header: "Pieces", sortable: true, cell: (tool) => (tool.pieces === 0 ? <StateMark tone="off">none</StateMark>
    : tool.piecesInService === tool.pieces ? <StateMark tone="good"><span className="num">{tool.pieces}</span> in service</StateMark>
      : <StateMark tone={tool.piecesInService === 0 ? "stop" : "caution"}><span className="num">{tool.piecesInService}</span> of <span className="num">{tool.pieces}</span></StateMark>) },
];
