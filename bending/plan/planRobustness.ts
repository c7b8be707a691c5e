import type { PlanCounts } from "./planCounts";

/**
 * How far each time setting may be off before another plan wins, all others as they are: between `low` and `high` no
 * other plan takes less time. Exact for what the planner proves: a plan's cost is linear in the settings.
 */
export interface PlanRobustness {
  /** Factors looked at on both sides. */
  readonly range: readonly [number, number];
  readonly settings: readonly SettingRobustness[];
  /** Plans made for it. */
  readonly plans: number;
}

export type TimeSetting = "flip" | "turn" | "walkPerMetre" | "stroke" | "gaugeMove" | "stationSetup" | "sectionPlace";

export interface SettingRobustness {
  readonly setting: TimeSetting;
  /** Seconds (each, or a metre) that the machine is set to. */
  readonly seconds: number;
  /** How often the plan pays it over the batch (metres for walking). */
  readonly count: number;
  /** Where another plan begins to win; null: none does within the range. */
  readonly low: RobustnessEnd | null;
  readonly high: RobustnessEnd | null;
  /** False when the time ended, or a plan was not proven, before both ends were settled. */
  readonly settled: boolean;
}

export interface RobustnessEnd {
  readonly seconds: number;
  /** Of the setting as it is; null where that is 0. */
  readonly factor: number | null;
  /** The plan that takes over beyond. */
  readonly other: { readonly order: readonly string[]; readonly stations: number; readonly counts: PlanCounts };
  /** What it does otherwise, e.g. "1 flip fewer, 2 gauge moves more". */
  readonly differs: string;
}
