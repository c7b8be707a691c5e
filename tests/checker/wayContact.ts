import type { Machine } from "@/bending";
import type { Body } from "./bodies";
import { convexDistance, type Bar } from "./convexDistance";
import { boxInto, boxToBar, type Box } from "./boxes";
import { barsOf, boxOfBar, type Thing } from "./toolBars";
import type { Zone } from "./zoneContact";

/** mm. Farther than any part reaches. */
const AWAY = 10_000;
const EVERYWHERE = 5000;

export interface Rest {
  /** All of the part, as it stands at rest. */
  readonly bodies: readonly Body[];
  readonly zone: Zone;
  readonly tip: number;
  /** How far the ram can still open. */
  readonly opening: number;
  /** How deep the sheet lies in the die. */
  readonly depth: number;
}

export interface Standing {
  readonly thing: Thing;
  /** Does it make the bend itself? Then the zone in the making may touch it until the part is lifted. */
  readonly makes: boolean;
}

/** The straight ways between the tools and the operator, as the product states them: each with the least room that all things leave on it. */
export const WAYS = ["pull low", "pull high", "slide low", "slide high", "closed"] as const;

export function openingOf(machine: Machine, heights: number, tip: number): number {
  return Math.max(0, Math.min(machine.stroke, machine.daylight - heights - tip));
}

/** Does the way keep everything off by more than `near` (0: off the shaved things)? */
export function wayIsClear(way: (typeof WAYS)[number], rest: Rest, standing: readonly Standing[], margin: number, near: number): boolean {
  const [low, high] = [rest.depth + 2 * margin, rest.opening - 2 * margin];
  const lift = way.endsWith("low") ? low : high;
  if (way !== "closed" && lift > high) return false;
  return standing.every(({ thing, makes }) => {
    const base = thing.onRam ? rest.tip : 0;
    const shaved = near === 0;
    if (way === "closed") return clear(rest, barsOf(thing, shaved, 0, base, 0, 0, -EVERYWHERE, EVERYWHERE), near, !makes);
    const parted = thing.onRam ? base + rest.opening - lift : -lift;
    const parting = thing.onRam ? barsOf(thing, shaved, 0, base, 0, rest.opening) : barsOf(thing, shaved, 0, 0, 0, -lift);
    const passing = way.startsWith("pull") ? barsOf(thing, shaved, 0, parted, AWAY, 0) : barsOf(thing, shaved, 0, parted, 0, 0, -EVERYWHERE, EVERYWHERE);
    return clear(rest, parting, near, !makes) && clear(rest, passing, near, true);
  });
}

const box: Box = new Float64Array(6);

function clear({ bodies, zone }: Rest, bars: readonly Bar[], near: number, withZone: boolean): boolean {
  for (const bar of bars) {
    const around = boxOfBar(bar);
    for (const body of bodies) {
      if (body.z[0] - bar.to > near || bar.from - body.z[1] > near) continue;
      boxInto(body.hull, box);
      if (boxToBar(box, 0, around, bar.from, bar.to) > near || convexDistance(body.hull, 0, bar, near) > near) continue;
      const parts = body.parts();
      if (parts === null || parts.some((part) => convexDistance(part, 0, bar, near) <= near)) return false;
    }
    if (withZone && boxToBar(zone.box, 0, around, bar.from, bar.to) <= near && zone.slices.some((slice) => convexDistance(slice, 0, bar, near) <= near)) return false;
  }
  return true;
}
