import type { Die, Hit, PartModel } from "@/bending";
import { zonePieces } from "./bodies";
import { bodyDistance, convexDistance, type Bar } from "./convexDistance";
import { move } from "./placing";
import { hitBend, placeParent, sidesOf } from "./placePart";
import { boxesMeet, boxInto, boxToBar, type Box } from "./boxes";
import { boxOfBar } from "./toolBars";

/** Slices that the zone in the making is looked at in, at the least. */
const SLICES = 8;

/** The zone in the making, slice by slice, in the machine, and the box round it. */
export interface Zone {
  readonly slices: readonly Float64Array[];
  readonly box: Box;
  readonly tip: number;
}

export function zoneInMaking(part: PartModel, hit: Hit, die: Die, angle: number): Zone {
  const box = new Float64Array(6);
  const bend = hitBend(part, hit);
  const placed = placeParent(part, hit, die, angle, sidesOf(part, hit)[bend.parent] === true);
  if (!placed) return { slices: [], tip: 0, box };
  const slices = hit.bends.flatMap((i) => zonePieces(part.bends[i] ?? bend, part.thickness, angle, 0, SLICES)).map((points) => Float64Array.from(points.flatMap((p) => move(placed.placing, p))));
  const all = new Float64Array(slices.reduce((sum, { length }) => sum + length, 0));
  let at = 0;
  for (const slice of slices) {
    all.set(slice, at);
    at += slice.length;
  }
  boxInto(all, box);
  return { slices, tip: placed.tip, box };
}

/** Distance of the zone in the making to a thing that does not make it (shaved or whole). */
export function zoneDistance({ slices, box, tip }: Zone, bars: readonly Bar[], onRam: boolean): number {
  const lift = onRam ? tip : 0;
  let least = 64;
  for (const bar of bars) {
    if (boxToBar(box, lift, boxOfBar(bar), bar.from, bar.to) >= least) continue;
    for (const slice of slices) least = Math.min(least, convexDistance(slice, lift, bar, least));
  }
  return least;
}

/** Does the zone in the making share something with one of the bodies? */
export function zoneMeets({ slices, box }: Zone, bodies: readonly Float64Array[]): boolean {
  return bodies.some((body) => {
    boxInto(body, bodyBox);
    return boxesMeet(box, bodyBox) && slices.some((slice) => bodyDistance(slice, body, 0.01) <= 0);
  });
}

const bodyBox: Box = new Float64Array(6);
