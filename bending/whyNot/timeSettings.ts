import type { PlanCounts } from "../plan/planCounts";
import type { TimeSetting } from "../plan/planRobustness";

/** What each time setting is paid for, in words, and whether it is paid for every part. */
export const timeSettings: readonly { readonly setting: TimeSetting; readonly count: keyof PlanCounts; readonly eachPart: boolean; readonly one: string; readonly many: string }[] = [
  { setting: "flip", count: "flips", eachPart: true, one: "flip", many: "flips" },
  { setting: "turn", count: "turns", eachPart: true, one: "quarter turn", many: "quarter turns" },
  { setting: "walkPerMetre", count: "metres", eachPart: true, one: "m of walking", many: "m of walking" },
  { setting: "stroke", count: "strokes", eachPart: true, one: "stroke", many: "strokes" },
  { setting: "gaugeMove", count: "gaugeMoves", eachPart: true, one: "gauge move", many: "gauge moves" },
  { setting: "stationSetup", count: "stations", eachPart: false, one: "station", many: "stations" },
  { setting: "sectionPlace", count: "pieces", eachPart: false, one: "piece", many: "pieces" },
];
