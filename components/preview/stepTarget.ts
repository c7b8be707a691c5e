import { applyFrame } from "@/bending/geometry/applyFrame";
import type { PlanModel, StepModel } from "@/lib/sheet/planModel";
import { stepFrames } from "@/lib/sheet/stepFrames";
import type { FitTarget } from "./FitView";

/** What the view of a step must hold: the sheet flat and bent, and the tools round the bend. */
export function stepTarget(model: PlanModel, step: StepModel): FitTarget {
  const corners = [0, step.finished].flatMap((angle) => {
    const { frames } = stepFrames(model, step, angle);
    return model.part.faces.flatMap((face, index) => {
      const frame = frames[index];
      return frame ? face.outline.map(([x, y]) => applyFrame(frame, [x, y, 0])) : [];
    });
  });
  const station = model.stations.find((entry) => entry.id === step.station);
  const tools = [station?.from ?? 0, station?.to ?? 0].flatMap((z) => [[0, step.punch.height * 0.8, z], [0, -step.die.height, z]] as const);
  const all = [...corners, ...tools];
  const low = ([0, 1, 2] as const).map((axis) => Math.min(...all.map((point) => point[axis])));
  const high = ([0, 1, 2] as const).map((axis) => Math.max(...all.map((point) => point[axis])));
  const middle = (axis: 0 | 1 | 2): number => ((low[axis] ?? 0) + (high[axis] ?? 0)) / 2;
  const size = ([0, 1, 2] as const).map((axis) => (high[axis] ?? 0) - (low[axis] ?? 0));
  return { centre: [middle(0), middle(1), middle(2)], radius: Math.max(60, Math.hypot(...size) / 2) };
}
