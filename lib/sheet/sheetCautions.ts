import { asSentence } from "@/lib/format/asSentence";
import { createSheetFormat } from "./createSheetFormat";
import type { PlanModel } from "./planModel";
import type { PlanSource, SheetCaution } from "./sheetView";

/** kg. Over this two people lift: common practice, no source; the shop's own limit and local rules decide. */
const TWO_PEOPLE_KG = 15;

/** What must be minded on this setup: first what always holds, then what this plan brings. Plain words, advice only. */
export function sheetCautions({ plan, machine, tools }: PlanSource, model: PlanModel): readonly SheetCaution[] {
  const format = createSheetFormat(plan.units);
  const force = Math.max(0, ...plan.steps.map((step) => step.forceKN));
  const ratings = model.stations.map(
    (station) => `${station.punch.id} ${format.force(station.punch.maxForcePerMetre)}/m, ${station.die.id} ${format.force(station.die.maxForcePerMetre)}/m`,
  );
  const always = (level: SheetCaution["level"], text: string): SheetCaution => ({ level, text, steps: [] });
  const lift = plan.flat.massKg > TWO_PEOPLE_KG
    ? [always("caution", `The blank weighs ${format.mass(plan.flat.massKg)}: two people, one named to work the pedal and the other clear of the stroke, or a lifting aid.`)]
    : [];
  return [
    always("stop", "Guarding of the bending point in place, and tested before the first stroke."),
    always("stop", "Tools undamaged, clean and secured top and bottom before the ram moves."),
    always("stop", "Hands clear of the punch, the die and the back gauge; never between part and gauge."),
    always("caution", "The sheet whips up in front as it bends: stand clear, support it from below with open hands."),
    always("caution", "Edges cut: gloves for handling, safety shoes, eyes protected."),
    always("caution", `Highest force ${format.force(force)} of the machine's ${format.force(machine.maxForce)}: set force and mode of control for this job. Tool ratings: ${[...new Set(ratings)].join("; ") || `${tools.length} tools`}.`),
    ...lift,
    ...plan.cautions.filter(({ kind }) => kind !== "lift" || lift.length === 0).map((caution): SheetCaution => ({
      level: "caution",
      text: asSentence(caution.message, [...caution.bends, ...caution.tools]),
      steps: model.steps.flatMap((step, index) => (step.step.bends.some((bend) => caution.bends.includes(bend)) ? [index + 1] : [])),
    })),
    always("caution", "Computed values are advice. The makers' ratings, local codes and the person trained or licensed to set the machine decide."),
  ];
}
