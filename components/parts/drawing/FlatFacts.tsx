import type { LengthUnit } from "@/bending/core/units";
import type { FlatPattern } from "@/bending/part/flatPattern";
import type { PartModel } from "@/bending/part/partModel";
import { classes } from "@/components/ui/classes";
import { formatLength } from "@/lib/format/formatLength";
import { formatMass } from "@/lib/format/formatMass";
import { formatNumber } from "@/lib/format/formatNumber";
import { mmPer } from "@/bending/core/units";

/** Blank size, area and mass, as the cells of a title block. */
export function FlatFacts({ part, flat, units, stale = false }: { readonly part: PartModel; readonly flat: FlatPattern; readonly units: LengthUnit; readonly stale?: boolean }) {
  const area = flat.area / mmPer(units) ** 2;
  const cells = [
    { label: "Blank", value: `${formatLength(flat.width, units, false)} × ${formatLength(flat.depth, units)}` },
    { label: "Bends", value: String(part.bends.length) },
    { label: "Area", value: units === "mm" ? `${formatNumber(area / 1e6, 4)} m²` : `${formatNumber(area, 2)} in²` },
    { label: "Mass", value: formatMass(flat.massKg) },
  ];
  return (
    <dl className={classes("flex flex-wrap border bg-sheet", stale ? "border-dashed border-rule-strong text-ink-faint line-through decoration-1" : "border-ink")}>
      {cells.map((cell) => (
        <div key={cell.label} className="min-w-28 grow border-r border-rule-strong px-3 py-1.5 last:border-r-0">
          <dt className="caption">{cell.label}</dt>
          <dd className="num text-base font-medium">{cell.value}</dd>
        </div>
      ))}
    </dl>
  );
}
