import type { Tool } from "@/bending";
import type { Bar } from "./convexDistance";
import { convexParts, type Ring } from "./convexParts";
import { SHAVED_MM } from "./limits";
import type { Modeller } from "./modeller";

/** A profile as convex parts: as it is, and shaved all round. */
export interface ToolShape {
  readonly rings: readonly Ring[];
  readonly shavedRings: readonly Ring[];
  readonly whole: readonly Float64Array[];
  readonly shaved: readonly Float64Array[];
  readonly box: readonly [number, number, number, number];
}

/** Something that stands beside the part: on the ram (it moves with the punch) or on the bed. */
export interface Thing {
  readonly name: string;
  readonly shape: ToolShape;
  readonly onRam: boolean;
  /** Height of its origin over the punch's tip (on the ram) or the die's top plane (on the bed). */
  readonly lift: number;
  readonly from: number;
  readonly to: number;
}

export function createToolShapes(modeller: Modeller): (profile: Tool["profile"]) => ToolShape {
  const known = new Map<Tool["profile"], ToolShape>();
  const flat = (rings: readonly Ring[]) => rings.flatMap((ring) => convexParts(ring)).map((ring) => Float64Array.from(ring.flat()));
  return (profile) => {
    const found = known.get(profile);
    if (found) return found;
    const shavedRings = modeller.grown(profile, -SHAVED_MM);
    const [xs, ys] = [profile.map(([x]) => x), profile.map(([, y]) => y)];
    const made: ToolShape = {
      rings: [profile], shavedRings, whole: flat([profile]), shaved: flat(shavedRings),
      box: [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)],
    };
    known.set(profile, made);
    return made;
  };
}

/** The convex bars of a thing, carried along (sweepX, sweepY) from (x, y) off its place. */
export function barsOf(thing: Thing, shaved: boolean, x = 0, y = 0, sweepX = 0, sweepY = 0, from = thing.from, to = thing.to): readonly Bar[] {
  const { lift } = thing;
  return (shaved ? thing.shape.shaved : thing.shape.whole).map((profile) => {
    const placed = new Float64Array(profile.length);
    for (let i = 0; i < profile.length; i += 2) {
      placed[i] = (profile[i] as number) + x;
      placed[i + 1] = (profile[i + 1] as number) + y + lift;
    }
    return { profile: placed, from, to, sweepX, sweepY };
  });
}

/** Box of a bar's profile with its sweep: least x and y, most x and y. */
export function boxOfBar({ profile, sweepX, sweepY }: Bar): readonly [number, number, number, number] {
  let ax = Infinity;
  let ay = Infinity;
  let bx = -Infinity;
  let by = -Infinity;
  for (let i = 0; i < profile.length; i += 2) {
    ax = Math.min(ax, profile[i] as number);
    bx = Math.max(bx, profile[i] as number);
    ay = Math.min(ay, profile[i + 1] as number);
    by = Math.max(by, profile[i + 1] as number);
  }
  return [ax + Math.min(0, sweepX), ay + Math.min(0, sweepY), bx + Math.max(0, sweepX), by + Math.max(0, sweepY)];
}
