import type { Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatNumber } from "@/lib/format/formatNumber";
import type { ValueItem } from "@/lib/schemas/bendTableViews";
import { Fixed } from "../Fixed";
import { valueStateWords } from "../valueStates";

const size = (value: number) => <span className="num">{formatNumber(value, 2)}</span>;

export const valueColumns: readonly Column<ValueItem>[] = [
  {
    key: "material", header: "Material", sortable: true, rowHeader: true, className: "whitespace-nowrap",
    cell: (value) => <TextLink href={`/bend-table/values/${encodeURIComponent(value.key)}`} aria-label={`${value.material}, ${value.thicknessMm} mm, V ${value.vOpeningMm}, punch ${value.punchRadiusMm}, ${value.angleDeg}°`}>{value.material}</TextLink>,
  },
  { key: "thickness", header: "Sheet, mm", sortable: true, align: "right", cell: ({ thicknessMm }) => size(thicknessMm) },
  { key: "vOpening", header: "V, mm", sortable: true, align: "right", cell: ({ vOpeningMm }) => size(vOpeningMm) },
  { key: "punchRadius", header: "Punch r", sortable: true, align: "right", cell: ({ punchRadiusMm }) => size(punchRadiusMm) },
  { key: "angle", header: "Angle", sortable: true, align: "right", cell: ({ angleDeg }) => <span className="num">{formatNumber(angleDeg, 1)}°</span> },
  { key: "deduction", header: "Deduction, mm", sortable: true, align: "right", cell: (value) => <><Fixed value={value.deductionMm} digits={2} />{value.expandedMm === null ? null : <span className="num ml-1.5 whitespace-nowrap text-ink-faint">± {value.expandedMm.toFixed(2)}</span>}</> },
  { key: "handbook", header: "To handbook", align: "right", cell: (value) => <Difference value={value} /> },
  { key: "k", header: "K", sortable: true, align: "right", cell: ({ k }) => <Fixed value={k} digits={3} /> },
  { key: "insideRadius", header: "Inside r, mm", sortable: true, align: "right", cell: (value) => <><Fixed value={value.radiusMm} digits={2} />{value.radiusSource === "measured" ? null : <span className="text-ink-faint" title={`not measured: ${value.radiusSource}`}>*</span>}</> },
  { key: "spread", header: "Spread, mm", sortable: true, align: "right", cell: ({ spreadMm }) => <Fixed value={spreadMm} digits={3} /> },
  { key: "trials", header: "Trials", sortable: true, align: "right", cell: ({ counted, excluded }) => <span className="num whitespace-nowrap">{counted}{excluded === 0 ? null : <span className="text-ink-faint" title={`${excluded} excluded`}> +{excluded}</span>}</span> },
  { key: "lastMeasured", header: "Last measured", sortable: true, cell: ({ lastMeasured }) => <span className="num whitespace-nowrap">{lastMeasured ?? "–"}</span> },
  { key: "state", header: "State", cell: ({ state }) => <StateMark tone={valueStateWords[state].tone}>{valueStateWords[state].label}</StateMark> },
];

/** How far the shop's deduction lies from the handbook's: with its sign, in mm. */
function Difference({ value: { deductionMm, handbookMm } }: { readonly value: ValueItem }) {
  if (deductionMm === null || handbookMm === null) return <span className="text-ink-faint">–</span>;
  const off = deductionMm - handbookMm;
  return <span className="num whitespace-nowrap text-ink-soft">{Number(off.toFixed(2)) > 0 ? "+" : ""}<Fixed value={off} digits={2} /></span>;
}
