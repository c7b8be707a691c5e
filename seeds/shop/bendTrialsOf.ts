import { deg, mm, toRad } from "@/bending/core/units";
import { bendAllowance } from "@/bending/handbook/bendAllowance";
import { bendDeduction } from "@/bending/handbook/bendDeduction";
import type { MaterialFacts, MaterialGroup } from "@/bending/handbook/material";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";

/** A trial as the toolroom wrote it down; lengths in mm, degrees turned through. */
export interface TrialSeed {
  readonly material: string;
  readonly batch: string;
  readonly nominal: number;
  readonly thickness: number;
  readonly vOpening: number;
  readonly punchRadius: number;
  readonly angle: number;
  readonly blank: number;
  readonly flanges: readonly [number, number];
  readonly insideRadius: number | null;
  readonly measuredOn: string;
  readonly measuredBy: string;
  readonly note: string;
}

interface TrialGroup {
  readonly material: MaterialFacts;
  readonly thickness: number;
  readonly vOpening: number;
  readonly angle: number;
  readonly count: number;
  readonly batch: string;
  readonly day: string;
  readonly by: string;
  readonly seed: number;
  readonly off?: readonly [index: number, millimetres: number, note: string];
}

/** How this shop's K lies off the handbook's, and how it scatters: invented, of the size that shops tell of. */
const OFF: Readonly<Record<MaterialGroup, number>> = { steel: 0.022, stainless: 0.031, aluminium: -0.026, copper: 0, brass: 0 };
const SCATTER_K = 0.006;

/** Trials of one sheet over one V, made up from the handbook's value with a scatter that is the same each time. */
export function trialsOf({ material, thickness, vOpening, angle, count, batch, day, by, seed, off }: TrialGroup): readonly TrialSeed[] {
  const random = seededNumbers(seed);
  const radius = naturalRadius(material, mm(vOpening));
  const { k } = resolveAllowance({ material, thickness: mm(thickness), insideRadius: radius, angle: toRad(deg(angle)) });
  // A delivery's sheets are all a little under the thickness that they are sold as.
  const delivered = thickness * (0.985 + 0.01 * random());
  return Array.from({ length: count }, (_, index): TrialSeed => {
    const measured = stepped(delivered + 0.012 * spread(random), 0.01);
    const reached = stepped(angle + 0.35 * spread(random), 1 / 12);
    const blank = stepped(100 + 0.06 * spread(random), 0.01);
    const turned = toRad(deg(reached));
    const own = k + OFF[material.group] + SCATTER_K * spread(random);
    const deduction = bendDeduction(turned, radius, mm(measured), bendAllowance(turned, radius, own, mm(measured))) + (off?.[0] === index ? off[1] : 0);
    const sum = blank + deduction;
    const first = stepped(sum / 2 + 0.4 * spread(random), 0.01);
    return {
      material: material.id, batch, nominal: thickness, thickness: measured, vOpening, punchRadius: 0.8, angle: reached, blank,
      flanges: [first, stepped(sum - first, 0.01)],
      insideRadius: index === 0 ? stepped(radius, 0.25) : null,
      measuredOn: day, measuredBy: by, note: off?.[0] === index ? off[2] : "",
    };
  });
}

/** As an instrument of this step shows it. */
const stepped = (value: number, step: number): number => Number((Math.round(value / step) * step).toFixed(4));

/** Near to a normal distribution: the sum of three even ones, standard deviation 1. */
const spread = (random: () => number): number => (random() + random() + random() - 1.5) * 2;

/** Even numbers from 0 to 1, the same for the same seed: a linear congruential generator (Park and Miller 1988, from memory). */
function seededNumbers(seed: number): () => number {
  let state = seed * 48_271;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}
