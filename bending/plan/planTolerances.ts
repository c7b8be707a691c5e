import { mmPer, type Mm } from "../core/units";
import { askedTolerance } from "../gauging/askedTolerance";
import type { GaugedStep } from "../gauging/gaugedStep";
import type { DimensionEnd, PartDimension } from "../gauging/partDimension";
import { partDimensions } from "../gauging/partDimensions";
import { partTolerances } from "../gauging/partTolerances";
import type { PartModel } from "../part/partModel";
import { drawnBend, readStrip } from "../strokes/drawnIds";
import type { PlanTolerance } from "./planTolerance";
import { rounded } from "./rounded";
import type { Situation } from "./situation";

/** What every dimension of the part may miss when it is bent in these steps, as the plan document says it. */
export function planTolerances({ part, machine, units }: Pick<Situation, "part" | "machine" | "units">, steps: readonly GaugedStep[]): readonly PlanTolerance[] {
  const { gaugeRepeat, angleRepeat } = machine.settings;
  const inUnits = (value: number) => rounded(value / mmPer(units));
  const orNull = (value: Mm | null) => (value === null ? null : inUnits(value));
  return partTolerances(part, steps, { gauge: gaugeRepeat, angle: angleRepeat }, partDimensions(part)).map(({ dimension, nominal, worstCase, statistical, shares }) => {
    const asked = askedTolerance(part, dimension);
    return {
      kind: dimension.kind,
      ...named(part, dimension),
      nominal: inUnits(nominal),
      worstCase: orNull(worstCase),
      statistical: orNull(statistical),
      ...(asked === null ? {} : { asked: inUnits(asked) }),
      shares: shares.map(({ step, gauge, angle }) => ({ step: step + 1, gauge: inUnits(gauge), angle: inUnits(angle) })),
    };
  });
}

/** Faces and bends by the names that were drawn. */
function named(part: PartModel, { face, direction, from, to }: PartDimension): Pick<PlanTolerance, "face" | "from" | "to" | "across"> {
  const faceName = (index: number) => {
    const id = part.faces[index]?.id ?? "";
    return readStrip(id)?.bend ?? id;
  };
  const endName = (ends: readonly DimensionEnd[]) => {
    // Of a size over all rather what stands out than the face that it is measured from.
    const end = ends.find((one) => one.at !== "point" || one.face !== face) ?? ends[0];
    return end === undefined ? "" : end.at === "point" ? end.name : drawnBend(part.bends[end.bend]?.id ?? "");
  };
  return { face: faceName(face), from: endName(from), to: endName(to), ...(Math.abs(direction[2]) > 0.5 ? { across: true as const } : {}) };
}
