import { materialFields, type MaterialFacts, type MaterialField } from "@/bending/handbook/material";
import { StateMark } from "@/components/ui/StateMark";
import { formatNumber } from "@/lib/format/formatNumber";
import { fieldWords, originWords, ruleWords } from "../materialWords";
import { RadiiTable } from "./RadiiTable";

/** Each value of a material with where it is from. */
export function ValueTable({ facts }: { readonly facts: MaterialFacts }) {
  return (
    <div className="overflow-x-auto border-y border-ink">
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">Values of {facts.id}</caption>
        <thead><tr className="border-b border-rule-strong text-sm text-ink-soft"><th scope="col" className="py-1 pr-3 font-medium">Value</th><th scope="col" className="px-3 py-1 text-right font-medium">{facts.id}</th><th scope="col" className="px-3 py-1 font-medium">Where it is from</th></tr></thead>
        <tbody>
          {materialFields.map((field) => (
            <tr key={field} className="border-b border-rule align-top last:border-b-0">
              <th scope="row" className="py-1.5 pr-3 font-normal text-ink-soft">{fieldWords[field]}</th>
              <td className="px-3 py-1.5 text-right font-medium"><Value field={field} facts={facts} /></td>
              <td className="px-3 py-1.5"><StateMark tone={facts.origins[field].kind === "published" ? "note" : facts.origins[field].kind === "shop" ? "good" : "caution"}>{originWords[facts.origins[field].kind]}</StateMark> <span className="text-ink-soft">{facts.origins[field].text}</span></td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Value({ field, facts }: { readonly field: MaterialField; readonly facts: MaterialFacts }) {
  const number = (value: number, digits: number, unit = "") => <span className="num whitespace-nowrap">{formatNumber(value, digits)}{unit}</span>;
  switch (field) {
    case "tensile": return <span className="num whitespace-nowrap">{formatNumber(facts.tensile[0], 1)} to {formatNumber(facts.tensile[1], 1)} MPa</span>;
    case "yield": return number(facts.yield, 1, " MPa");
    case "modulus": return number(facts.modulus / 1000, 1, " GPa");
    case "density": return number(facts.density, 1, " kg/m³");
    case "straightLengthGroup": return <>{facts.straightLengthGroup}</>;
    case "naturalRadiusRatio": return number(facts.naturalRadiusRatio, 4);
    case "defaultRadiusPerThickness": return number(facts.defaultRadiusPerThickness, 3);
    case "allowance": return facts.allowance.rule === "k" ? <span className="num">K {facts.allowance.k}</span> : <>{ruleWords[facts.allowance.rule]}</>;
    case "minimumRadii": return facts.minimumRadii === null ? <>not known</> : <RadiiTable table={facts.minimumRadii} />;
    case "springbackRow": return facts.springbackRow === null ? <>yield and modulus</> : <>kR of {facts.springbackRow}</>;
    default: return field satisfies never;
  }
}
