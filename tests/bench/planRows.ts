import { planPart } from "@/bending/plan/planPart";
import { planParts, planRequestFor } from "./planParts";

/** Seconds that a plan may take. */
const LIMIT = 30;
/** Parts of up to so many bends are planned three times. */
const QUICK = 8;

const families = [
  ["corrugated", "plan a corrugated sheet", [4, 6, 8, 10, 12, 16, 20, 24]],
  ["hats", "plan a hat profile", [4, 8, 12, 16]],
  ["tray", "plan a tray with rims", [8, 12, 16]],
] as const;

/** Whole plans with everything that the invented shop has: tools, order, stations, gauge. */
export function planRows(): readonly { readonly name: string; readonly size: number; readonly runs: number; readonly plan: () => ReturnType<typeof planPart> }[] {
  return families.flatMap(([family, name, sizes]) => sizes.map((size) => ({
    name, size, runs: size <= QUICK ? 3 : 1,
    plan: () => {
      const end = performance.now() + LIMIT * 1000;
      return planPart({ ...planRequestFor(planParts[family](size)), shouldStop: () => performance.now() > end });
    },
  })));
}
