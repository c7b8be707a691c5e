import type { MPa } from "../core/units";
import { MILD_STEEL_US } from "./forceForms";

export interface PublishedMultiplier {
  readonly material: string;
  readonly factor: number;
  readonly chart: string;
}

const first = "trade chart, base mild steel 60 ksi";
const second = "second trade chart, base mild steel";
const third = "third trade chart, base 420 MPa";

/** What charts multiply the mild-steel force by. They part from the plain ratio of strengths, which is better where the strength is known. */
export const publishedMultipliers: readonly PublishedMultiplier[] = [
  { material: "soft brass", factor: 0.5, chart: first },
  { material: "soft aluminium", factor: 0.5, chart: first },
  { material: "heat-treated aluminium", factor: 1, chart: first },
  { material: "stainless", factor: 1.5, chart: first },
  { material: "chrome-molybdenum", factor: 2, chart: first },
  { material: "stainless", factor: 1.55, chart: second },
  { material: "aluminium 3xxx-H14", factor: 0.35, chart: `${second} (alloy printed as 3303)` },
  { material: "aluminium 5052-H34", factor: 0.65, chart: second },
  { material: "aluminium 6061-T6", factor: 0.75, chart: second },
  { material: "aluminium 300 MPa", factor: 0.65, chart: third },
  { material: "stainless 700 MPa", factor: 1.6, chart: third },
];

/** Force over the base steel's force: the ratio of tensile strengths, which every form of the force has in it. */
export function materialMultiplier(tensile: MPa, base: MPa = MILD_STEEL_US): number {
  return tensile / base;
}
