import type { LengthUnit } from "@/bending/core/units";
import { formatInchFraction } from "@/lib/format/formatInchFraction";
import { formatQuantity } from "@/lib/format/formatQuantity";
import type { Answer } from "@/lib/calculator/answer";
import { CopyButton } from "./CopyButton";
import { FormulaView } from "./FormulaView";

/** One answer: what it is, the number in both systems of units, the formula with the numbers in it, its source. */
export function AnswerRow({ answer, group, units }: { readonly answer: Answer; readonly group: string | undefined; readonly units: LengthUnit }) {
  const { label, formula, source, note } = answer;
  const main = said(answer, units);
  const other = said(answer, units === "mm" ? "in" : "mm");
  return (
    <li className="grid grid-cols-1 gap-x-8 gap-y-1 border-b border-rule py-2.5 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.1fr)]">
      <div className="min-w-0">
        <h4 className="font-medium">{label}</h4>
        <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <output className="num text-xl font-semibold whitespace-nowrap">{main}</output>
          {other === main ? null : <span className="num whitespace-nowrap text-ink-soft">{other}</span>}
          {fraction(answer)}
          <span className="ml-auto"><CopyButton name={group === undefined ? label : `${label}, ${group}`} text={main} /></span>
        </div>
      </div>
      <div className="min-w-0">
        {formula === undefined ? null : <FormulaView formula={formula} units={units} result={formatQuantity(answer.value, answer.kind, units)} />}
        <p className="text-sm text-ink-faint">{note === undefined ? null : <span className="text-ink-soft">{note} </span>}Source: {source}.</p>
      </div>
    </li>
  );
}

function said({ value, upTo, kind }: Answer, units: LengthUnit): string {
  const whole = formatQuantity(value, kind, units);
  return upTo === undefined ? whole : `${formatQuantity(value, kind, units).replace(/ .*$/, "")} to ${formatQuantity(upTo, kind, units)}`;
}

/** The nearest sixty-fourth of an inch, as rules are divided. */
function fraction({ kind, value, upTo }: Answer) {
  if (kind !== "length" || upTo !== undefined || Math.abs(value) < 25.4 / 128) return null;
  return <span className="num whitespace-nowrap text-ink-faint">≈ {formatInchFraction(value / 25.4)} in</span>;
}
