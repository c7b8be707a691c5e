import type { Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatNumber } from "@/lib/format/formatNumber";
import type { TrialView } from "@/lib/schemas/bendTableViews";
import { Fixed } from "../Fixed";
import { trialStateWords } from "../valueStates";

const size = (value: number) => <span className="num">{formatNumber(value, 2)}</span>;

export const trialColumns: readonly Column<TrialView>[] = [
  {
    key: "number", header: "Trial", sortable: true, rowHeader: true, className: "whitespace-nowrap",
    cell: ({ number, valueKey }) => (valueKey === null ? <span className="num">{number}</span> : <TextLink href={`/bend-table/values/${encodeURIComponent(valueKey)}`}><span className="num">{number}</span></TextLink>),
  },
  { key: "material", header: "Material", sortable: true, className: "whitespace-nowrap", cell: ({ material }) => material },
  { key: "batch", header: "Batch", sortable: true, cell: ({ batch }) => batch || <span className="text-ink-faint">–</span> },
  { key: "thickness", header: "Sheet", sortable: true, align: "right", cell: ({ nominalMm, thicknessMm }) => <span className="whitespace-nowrap">{size(nominalMm)}<span className="ml-1.5 text-ink-faint">({size(thicknessMm)})</span></span> },
  { key: "vOpening", header: "V", sortable: true, align: "right", cell: ({ vOpeningMm }) => size(vOpeningMm) },
  { key: "punchRadius", header: "Punch r", sortable: true, align: "right", cell: ({ punchRadiusMm }) => size(punchRadiusMm) },
  { key: "angle", header: "Angle", sortable: true, align: "right", cell: ({ angleDeg }) => <span className="num">{formatNumber(angleDeg, 2)}°</span> },
  { key: "blank", header: "Blank", align: "right", cell: ({ blankMm }) => <Fixed value={blankMm} digits={2} /> },
  { key: "flanges", header: "Flanges", align: "right", cell: ({ flangesMm }) => <span className="num whitespace-nowrap">{flangesMm[0].toFixed(2)} + {flangesMm[1].toFixed(2)}</span> },
  { key: "deduction", header: "Deduction", align: "right", cell: ({ result }) => (result === null ? <span className="text-ink-faint">–</span> : <><Fixed value={result.deduction.value} digits={2} /><span className="num ml-1.5 whitespace-nowrap text-ink-faint">± {result.deduction.expanded.toFixed(2)}</span></>) },
  { key: "measuredOn", header: "Measured", sortable: true, cell: ({ measuredOn, measuredBy, measuredWith }) => <span className="text-sm" title={measuredWith.join(", ")}><span className="num whitespace-nowrap">{measuredOn}</span> {measuredBy}</span> },
  { key: "state", header: "State", className: "min-w-40", cell: (trial) => <Standing trial={trial} /> },
];

function Standing({ trial: { state, excluded, withdrawn, problem, note } }: { readonly trial: TrialView }) {
  const why = withdrawn ?? excluded;
  return (
    <div className="text-sm">
      {problem === null || state === "withdrawn" ? <StateMark tone={trialStateWords[state].tone}>{trialStateWords[state].label}</StateMark> : <StateMark tone="stop">cannot be true</StateMark>}
      {why === null ? null : <p>{why.reason} <span className="text-ink-faint">({why.by}, {why.at.slice(0, 10)})</span></p>}
      {problem === null ? null : <p className="text-ink-soft">{problem}</p>}
      {note === "" ? null : <p className="text-ink-soft">{note}</p>}
    </div>
  );
}
