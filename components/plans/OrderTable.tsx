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

const heads = ["", "Bend", "Up", "In front", "To gauge", "Tools", "Gauge X", "R", "Z", "Angle", "Demanded", "Force", "Depth", "Handling"];

/** The steps with everything the machine is set to; a row is chosen by its number or anywhere on it. */
export function OrderTable({ model, selected, onSelect }: OrderTableProps) {
  return (
    <div className="overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label="Order of the bends">
      <table className="w-full border-collapse text-left text-sm">
        <thead>
          <tr className="border-b border-rule-strong">{heads.map((head) => <th key={head} scope="col" className="px-2 py-1.5 font-medium whitespace-nowrap text-ink-soft">{head === "" ? <span className="sr-only">Step</span> : head}</th>)}</tr>
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
                <td className="px-2 py-2 font-medium">{text.bends}</td>
                <td className="px-2 py-2 font-semibold">{upSide(model, step)}</td>
                <td className="px-2 py-2">{step.step.front}</td>
                <td className="px-2 py-2">{edgeName(model, step)}</td>
                <td className="px-2 py-2 whitespace-nowrap"><span className="num">{text.punch}</span><br /><span className="num">{text.die}</span> <span className="text-ink-soft">at {text.station}</span></td>
                <td className="num px-2 py-2 text-right font-medium">{text.gaugeX}</td>
                <td className="num px-2 py-2 text-right">{text.gaugeR}</td>
                <td className="num px-2 py-2 text-right whitespace-nowrap">{text.fingers.map((finger) => <span key={finger.z} className="block">{finger.z}</span>)}</td>
                <td className="num px-2 py-2 text-right">{text.angle}</td>
                <td className="num px-2 py-2 text-right">{text.demandedAngle}</td>
                <td className="num px-2 py-2 text-right whitespace-nowrap">{text.force}</td>
                <td className="num px-2 py-2 text-right whitespace-nowrap">{text.depth}</td>
                <td className="px-2 py-2">{text.handling}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
