import type { Clearance } from "../../clearance/clearance";
import type { LengthUnit } from "../../core/units";
import type { PartModel } from "../../part/partModel";
import type { Machine } from "../../tooling/machine";
import type { Die, Punch, Tool } from "../../tooling/tool";
import type { PlanDocument, PlanReason, PlanStep, ReasonKind } from "../planDocument";
import type { Hit } from "../../clearance/hit";

/** What the questions about a stored plan are asked of: the part by the plan's own numbers, the shop as it is. */
export interface StoredContext {
  readonly plan: PlanDocument;
  readonly part: PartModel;
  readonly machine: Machine;
  readonly units: LengthUnit;
  /** Millimetres for one of the plan's units. */
  readonly per: number;
  readonly clearance: Clearance;
  readonly airForceFactor: number;
  /** The tool as it is now; as it was planned when none of it is in service, which is a finding of its own. */
  readonly toolOf: (id: string) => Tool | undefined;
}

/** A step joined with its part and tools. */
export interface StoredStep {
  readonly step: PlanStep;
  readonly hit: Hit;
  readonly punch: Punch;
  readonly die: Die;
}

export const storedReason = (kind: ReasonKind, message: string, of: Partial<Pick<PlanReason, "bends" | "faces" | "tools">> = {}): PlanReason =>
  ({ kind, bends: [], faces: [], tools: [], ...of, message });
