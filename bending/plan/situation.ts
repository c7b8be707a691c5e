import type { Clearance } from "../clearance/clearance";
import type { LengthUnit, KiloNewtonPerMetre, Mm, Rad } from "../core/units";
import type { Move } from "../order/collectMoves";
import type { PartModel } from "../part/partModel";
import type { FingerAgainstTools } from "../setup/createFingerAgainstTools";
import type { RunsOf } from "../setup/createRuns";
import type { BendSplit } from "../strokes/bendSplit";
import type { Machine } from "../tooling/machine";
import type { ReasonKind } from "./planDocument";
import type { ToolPair } from "./toolPair";

/** Whether a bend can be formed with a pair at all, whatever the order. */
export type ToolFit =
  | {
    readonly ok: true;
    /** Wishes left unmet: a V far from the rule or from the radius asked for. */
    readonly wishes: readonly FitProblem[];
    /** Angle that the stroke goes to, springback allowed for. */
    readonly demanded: Rad;
    readonly force: KiloNewtonPerMetre;
    /** Level sheet needed on either side of the line. */
    readonly reach: Mm;
  }
  | { readonly ok: false; readonly problem: FitProblem };

export interface FitProblem {
  readonly kind: ReasonKind;
  readonly tools: readonly string[];
  readonly message: string;
  /** How far off it is, in parts of what is needed: the least tells which tool is nearest to right. */
  readonly off: number;
}

/** Everything that a search asks about one part on one machine with the candidate tools. */
export interface Situation {
  /** Every stroke a bend of its own, also where several make one of the drawn bends. */
  readonly part: PartModel;
  readonly drawn: PartModel;
  readonly splits: readonly BendSplit[];
  readonly machine: Machine;
  readonly units: LengthUnit;
  readonly moves: readonly Move[];
  readonly pairs: readonly ToolPair[];
  readonly clearance: Clearance;
  readonly fingers: FingerAgainstTools;
  readonly runs: RunsOf;
  /** By bend, then by pair. */
  readonly fits: readonly (readonly ToolFit[])[];
  /** False for moves that a person's own order rules out, or that would leave a gap in a row of strokes. */
  readonly allowed: (move: number, formed: number) => boolean;
}
