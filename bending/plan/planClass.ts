import type { Candidate } from "./createCandidateKeeper";
import type { Situation } from "./situation";

/**
 * What tells really different plans apart: the pairs of their stations (however long, wherever they stand), and the stages of the work
 * between which the sheet is turned, turned over or taken to another station, each with the bends made in it. Plans that differ
 * only in the order of strokes within a stage, or in the length or place of stations of the same pairs, are alike.
 */
export function planClass({ moves }: Situation, { steps, layout: { stations } }: Candidate): string {
  const names = stations.map(({ pair }) => String(pair));
  const stages: { readonly at: string; bends: number }[] = [];
  for (const { move, station } of steps) {
    const { pose, mask } = moves[move] ?? { pose: { up: 1, heading: 0 }, mask: 0 };
    const at = `${names[station] ?? ""} ${pose.up} ${pose.heading.toFixed(3)}`;
    const last = stages[stages.length - 1];
    if (last?.at === at) last.bends |= mask;
    else stages.push({ at, bends: mask });
  }
  return [[...names].sort().join(), ...stages.map(({ at, bends }) => `${at} ${bends}`)].join(" | ");
}
