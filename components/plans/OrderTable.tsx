"use client";
import { classes } from "@/components/ui/classes";
import { edgeName } from "@/lib/sheet/edgeName";
import type { PlanModel } from "@/lib/sheet/planModel";
import { stepNumbers } from "@/lib/sheet/stepNumbers";
import { upSide } from "@/lib/sheet/upSide";

interface OrderTableProps {
  readonly model: PlanModel;
  readonly selected: number;
  readonly onSelect: (step: number) => void;
}

/** Head and whether the column holds numbers, which stand to the right. */
const heads = [["", false], ["Bend", false], ["Up", false], ["In front", false], ["To gauge", false], ["Tools", false], ["Gauge X, R", true], ["Z", true], ["Angle, demanded", true], ["Force, depth", true], ["Handling", false]] as const;

/** The steps with everything the machine is set to; a row is chosen by its number or anywhere on it. */
export function OrderTable({ model, selected, onSelect }: OrderTableProps) {
  return (
    <div className="overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label="Order of the bends">
      <table className="w-full border-collapse text-left text-sm">
        <thead>
          <tr className="border-b border-rule-strong">{heads.map(([head, number]) => <th key={head} scope="col" className={classes("px-1.5 py-1.5 align-bottom font-medium text-ink-soft", number && "text-right")}>{head === "" ? <span className="sr-only">Step</span> : head}</th>)}</tr>
        </thead>
        <tbody>
          {model.steps.map((step, index) => {
            const text = stepNumbers(step.step, model.units);
            const on = index === selected;
            return (
              <tr key={text.bends} onClick={() => onSelect(index)} aria-selected={on} className={classes("cursor-pointer border-b border-rule align-top last:border-b-0", on ? "bg-accent-wash" : "hover:bg-wash")}>
                <th scope="row" className="p-1">
                  <button type="button" aria-pressed={on} aria-label={`Show step ${index + 1}`} className={classes("num flex size-8 items-center justify-center border font-semibold", on ? "border-accent bg-accent text-accent-on" : "border-rule-strong bg-sheet")}>{index + 1}</button>
                </th>
                <td className="px-1.5 py-2 font-medium">{text.bends}</td>
                <td className="px-1.5 py-2 font-semibold">{upSide(model, step)}</td>
                <td className="px-1.5 py-2">{step.step.front}</td>
                <td className="px-1.5 py-2">{edgeName(model, step)}</td>
                <td className="px-1.5 py-2 whitespace-nowrap"><span className="num">{text.punch}</span><br /><span className="num">{text.die}</span> <span className="text-ink-soft">at {text.station}</span></td>
                <Pair first={text.gaugeX} second={text.gaugeR} />
                <td className="num px-1.5 py-2 text-right whitespace-nowrap">{text.fingers.map((finger) => <span key={finger.z} className="block">{finger.z}</span>)}</td>
                <Pair first={text.angle} second={text.demandedAngle} />
                <Pair first={text.force} second={text.depth} />
                <td className="px-1.5 py-2">{text.handling}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

/** Two numbers that belong together, one under the other. */
function Pair({ first, second }: { readonly first: string; readonly second: string }) {
  return <td className="num px-1.5 py-2 text-right whitespace-nowrap"><span className="block font-medium">{first}</span><span className="block">{second}</span></td>;
}
