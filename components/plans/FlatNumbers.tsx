import { AllowanceSource } from "@/components/ui/AllowanceSource";
import { Facts } from "@/components/ui/Facts";
import { mmPer } from "@/bending/core/units";
import { scaledBasis } from "@/bending/handbook/scaledBasis";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { sheetFlat } from "@/lib/sheet/sheetFlat";

/** Blank size, and for every bend its allowance and where that comes from. */
export function FlatNumbers({ plan }: { readonly plan: PlanDocument }) {
  const flat = sheetFlat(plan);
  return (
    <>
      <Facts rows={[
        { label: "Blank", value: <span className="num">{flat.width} × {flat.depth}</span> },
        { label: "Area", value: <span className="num">{flat.area}</span> },
        { label: "Weight", value: <span className="num">{flat.mass}</span> },
      ]} />
      <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label="Bend allowances">
        <table className="w-full border-collapse text-left text-sm">
          <thead><tr className="border-b border-rule-strong">{["Bend", "Allowance", "Deduction", "K", "Inside radius", "From"].map((head) => <th key={head} scope="col" className="py-1 pr-3 font-medium text-ink-soft">{head}</th>)}</tr></thead>
          <tbody>
            {flat.bends.map((bend, index) => (
              <tr key={bend.id} className="border-b border-rule">
                <th scope="row" className="py-1 pr-3 font-medium">{bend.id}</th>
                <td className="num py-1 pr-3 whitespace-nowrap">{bend.allowance}</td>
                <td className="num py-1 pr-3 whitespace-nowrap">{bend.deduction}</td>
                <td className="num py-1 pr-3">{bend.k}</td>
                <td className="num py-1 pr-3 whitespace-nowrap">{bend.insideRadius}</td>
                <td className="py-1">{sourceOf(plan, index) ?? bend.source}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </>
  );
}

/** Null for a plan of before the source was kept as data. */
function sourceOf({ flat, units }: PlanDocument, index: number) {
  const bend = flat.bends[index];
  return bend?.basis ? <AllowanceSource bend={bend.id} basis={scaledBasis(bend.basis, mmPer(units))} units={units} /> : null;
}
