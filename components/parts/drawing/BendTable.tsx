import type { LengthUnit } from "@/bending/core/units";
import { unitName } from "@/lib/format/unitName";
import type { Bend, PartModel } from "@/bending/part/partModel";
import { mmPer } from "@/bending/core/units";
import { AllowanceSource } from "@/components/ui/AllowanceSource";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatFixed } from "@/lib/format/formatFixed";
import { bendLook } from "./bendLook";

/** Each bend with the numbers that the flat length is made of, and where each comes from. */
export function BendTable({ part, units }: { readonly part: PartModel; readonly units: LengthUnit }) {
  const length = (value: number) => <span className="num">{formatFixed(value / mmPer(units), units === "in" ? 4 : 2)}</span>;
  const columns: readonly Column<Bend>[] = [
    { key: "id", header: "Bend", rowHeader: true, cell: (bend) => <span className="font-medium whitespace-nowrap">{bend.id}</span> },
    { key: "angle", header: "Angle", align: "right", cell: (bend) => <span className="num">{formatAngle((bend.angle * 180) / Math.PI)}</span> },
    { key: "direction", header: "Way", cell: (bend) => <span className="whitespace-nowrap">{bendLook[bend.direction].letter}, {bend.direction}{bend.hem === null ? "" : `, ${bend.hem} hem`}</span> },
    { key: "radius", header: "Radius", align: "right", cell: (bend) => length(bend.insideRadius) },
    { key: "allowance", header: "Allowance", align: "right", cell: (bend) => length(bend.allowance) },
    { key: "deduction", header: "Deduction", align: "right", cell: (bend) => length(bend.deduction) },
    { key: "k", header: "K", align: "right", cell: (bend) => <span className="num">{formatFixed(bend.k, 3)}</span> },
    { key: "source", header: "Where from", className: "min-w-44 text-sm text-ink-soft", cell: (bend) => <>{bend.allowanceBasis ? <AllowanceSource bend={bend.id} basis={bend.allowanceBasis} units={units} /> : bend.allowanceSource}. Radius: {bend.radiusSource}.</> },
  ];
  return <DataTable caption={`Bends, lengths in ${unitName(units)}`} columns={columns} rows={part.bends} rowKey={(bend) => bend.id} dense
    empty={<p className="text-ink-soft">The part has no bend yet.</p>} />;
}
