import type { OrderStep } from "../order/orderProblem";
import type { PlacedStation } from "../setup/layout";
import { loadOffset } from "./loadOffset";
import type { StepChecks } from "./createStepChecks";
import type { Situation } from "./situation";

export interface StepLoad {
  readonly forceKN: number;
  /** Middle of the load from the middle of the stroke's line along the bed, mm. */
  readonly offset: number;
}

/** What a step presses with on a station, and where. */
export function stepLoad({ part, moves, fits }: Situation, checks: StepChecks, { pair }: Pick<PlacedStation, "pair">, { move, formed }: Pick<OrderStep, "move" | "formed">): StepLoad {
  const fit = fits[moves[move]?.bends[0] ?? -1]?.[pair];
  return { forceKN: fit?.ok ? (fit.force * (moves[move]?.bentLength ?? 0)) / 1000 : 0, offset: loadOffset(part, checks.hitOf(move, formed)) };
}
