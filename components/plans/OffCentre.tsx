import { mmPer } from "@/bending/core/units";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";

/** Where each step loads the bed, and how much the brake bears there; nothing for a brake whose rating holds all along its bed. */
export function OffCentre({ plan }: { readonly plan: PlanDocument }) {
  const format = createSheetFormat(plan.units);
  const per = mmPer(plan.units);
  const steps = plan.steps.flatMap(({ bends, forceKN, offCentre }, index) => (offCentre ? [{ index, name: bends.join(" + "), forceKN, offCentre }] : []));
  if (steps.length === 0) return null;
  return (
    <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label="Load off the middle of the bed">
      <table className="border-collapse text-left text-sm">
        <caption className="sr-only">Load off the middle of the bed</caption>
        <thead><tr className="border-b border-rule-strong">{["Step", "Bend", "Load", `From the middle, ${plan.units}`, "The brake bears there", "Used"].map((head) => <th key={head} scope="col" className="py-1 pr-6 font-medium text-ink-soft">{head}</th>)}</tr></thead>
        <tbody>
          {steps.map(({ index, name, forceKN, offCentre }) => (
            <tr key={index} className="border-b border-rule">
              <th scope="row" className="num py-1 pr-6 font-medium">{index + 1}</th>
              <td className="py-1 pr-6">{name}</td>
              <td className="num py-1 pr-6">{format.force(forceKN)}</td>
              <td className="num py-1 pr-6">{format.place(offCentre.z * per)}</td>
              <td className="num py-1 pr-6">{format.force(offCentre.limitKN)}</td>
              <td className="num py-1 pr-6">{((forceKN / offCentre.limitKN) * 100).toFixed(0)} %</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
