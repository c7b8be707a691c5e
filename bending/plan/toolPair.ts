import type { Die, Punch } from "../tooling/tool";

/** A punch and a die that fit this machine together; `index` is the place among the candidates, likeliest first. */
export interface ToolPair {
  readonly index: number;
  readonly punch: Punch;
  readonly die: Die;
}
