import type { LengthUnit } from "../core/units";
import type { PlanReason } from "./planDocument";
import type { PlanTolerance } from "./planTolerance";
import { toleranceName } from "./toleranceName";

/** Every dimension whose tolerance these steps do not keep with certainty; `bendsOf` names the bends of each step, `stop` is what one stop of the gauge repeats to. */
export function toleranceCautions(tolerances: readonly PlanTolerance[], bendsOf: readonly (readonly string[])[], stop: number, units: LengthUnit): readonly PlanReason[] {
  return tolerances.flatMap((tolerance): readonly PlanReason[] => {
    const { asked, worstCase, statistical, shares, face } = tolerance;
    if (asked === undefined || (worstCase !== null && worstCase <= asked)) return [];
    const steps = shares.map(({ step }) => step);
    const bends = [...new Set(steps.flatMap((step) => bendsOf[step - 1] ?? []))];
    return [{ kind: "tolerance", bends, faces: [face], tools: [], message: `${toleranceName(tolerance)}: ±${shown(asked, units)} is asked for; ${told(worstCase, statistical, asked, steps, units)}${asked < stop ? `; no order keeps it on this machine, since one stop alone is ±${shown(stop, units)}` : ""}` }];
  });
}

function told(worstCase: number | null, statistical: number | null, asked: number, steps: readonly number[], units: LengthUnit): string {
  const names = `${steps.length === 1 ? "step" : "steps"} ${steps.join(", ")}`;
  if (worstCase === null || statistical === null) return `nothing bounds it, since of ${names} one has nothing to gauge from`;
  const most = `it may miss by ±${shown(worstCase, units)} through ${names}`;
  return statistical <= asked ? `about 95 of 100 parts keep it (±${shown(statistical, units)}), at worst ${most}` : `${most}, by ±${shown(statistical, units)} in 95 of 100 parts; measure every part`;
}

const shown = (value: number, units: LengthUnit): string => `${value.toFixed(units === "in" ? 4 : 2)} ${units}`;
