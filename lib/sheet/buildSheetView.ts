import type { PlanSource, SheetHeader, SheetView } from "./sheetView";
import { bedMap } from "./bedMap";
import { createSheetFormat } from "./createSheetFormat";
import { planModel, type PlanModel } from "./planModel";
import { sheetCautions } from "./sheetCautions";
import { sheetFlat } from "./sheetFlat";
import { sheetMeasurements } from "./sheetMeasurements";
import { sheetPickList } from "./sheetPickList";
import { sheetStep } from "./sheetStep";

export interface SheetInput extends PlanSource {
  readonly part: { readonly number: string; readonly name: string; readonly revision: number };
  readonly sheet: { readonly number: string };
}

/** Everything that a setup sheet says, as text and drawings. The plan must be one that can be made (it has steps). */
export function buildSheetView(input: SheetInput): SheetView {
  const { document, material, machine } = input;
  const plan = { ...input.plan, alternatives: [] };
  const used = new Set(plan.steps.flatMap((step) => [step.punch, step.die]).concat(plan.stations.flatMap((station) => [station.punch, station.die])));
  const tools = input.tools.filter((tool) => used.has(tool.id));
  const source: PlanSource = { plan, document, material, machine, tools };
  const model = planModel(source);
  return {
    format: "sheet/1",
    header: header(input, model),
    cautions: sheetCautions(source, model),
    pickList: sheetPickList(model),
    bedMap: bedMap(model),
    steps: model.steps.map((step, index) => sheetStep(model, step, index)),
    measurements: sheetMeasurements(source, model),
    flat: sheetFlat(plan),
    source,
  };
}

function header({ plan, document, material, machine, part, sheet }: SheetInput, model: PlanModel): SheetHeader {
  const format = createSheetFormat(plan.units);
  return {
    number: sheet.number,
    partNumber: part.number,
    partName: part.name,
    revision: String(part.revision),
    material: `${material.id} (${material.standard})`,
    thickness: format.fine(model.part.thickness),
    machine: machine.name,
    batch: String(plan.batch),
    units: plan.units === "in" ? "inches" : "millimetres",
    status: statusText(plan.status, plan.gap),
    setupTime: format.time(plan.seconds.setup),
    timePerPart: format.time(plan.seconds.perPart),
    bends: String(plan.flat.bends.length),
    stations: String(model.stations.length),
    conventions: [
      "TOP is the top of the base as drawn, UNDER its underside.",
      `Lengths are ${document.dimension ?? "outside"} dimensions. Places along the bed count from its middle, + to the operator's right.`,
      "Gauge X from the punch line, R from the die's top.",
    ],
  };
}

function statusText(status: SheetView["source"]["plan"]["status"], gap: number): string {
  switch (status) {
    case "optimal": return "least total time, proven";
    case "feasible": return `works; at most ${(gap * 100).toFixed(1)} % over the least total time`;
    case "infeasible": return "cannot be made as it stands";
    case "unknown": return "undecided";
    default: return status satisfies never;
  }
}
