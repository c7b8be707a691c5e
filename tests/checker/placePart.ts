import type { Bend, Die, Hit, PartModel } from "@/bending";
import { contactHeight } from "./contactHeight";
import { after, move, UNMOVED, type Placing, type Point } from "./placing";
import { rolled, stripOf } from "./rolled";

export interface PlacedPart {
  /** For each face its placing in the machine: die top at y = 0, punch on x = 0, z = 0 in the middle of the stroke's lines. */
  readonly faces: readonly Placing[];
  /** Height of the punch's tip. */
  readonly tip: number;
}

/** Which faces are in front: those that hang together with `front` without crossing a bend of the stroke; a crossing changes sides. */
export function sidesOf(part: PartModel, hit: Hit): readonly boolean[] {
  const side = new Map<number, boolean>([[hit.front, true]]);
  for (let found = true; found; ) {
    found = false;
    part.bends.forEach((bend, i) => {
      const flips = hit.bends.includes(i);
      for (const [from, to] of [[bend.parent, bend.child], [bend.child, bend.parent]] as const) {
        const known = side.get(from);
        if (known === undefined || side.has(to)) continue;
        side.set(to, known !== flips);
        found = true;
      }
    });
  }
  return part.faces.map((_, i) => side.get(i) === true);
}

export const hitBend = (part: PartModel, hit: Hit): Bend => {
  const bend = part.bends[hit.bends[0] ?? -1];
  if (!bend) throw new Error("a stroke forms a bend");
  return bend;
};

export const angleOf = (part: PartModel, hit: Hit, angle: number) => (i: number): number =>
  hit.bends.includes(i) ? angle : (hit.formed >> i) & 1 ? part.bends[i]?.angle ?? 0 : 0;

/** The parent of the stroke's first bend as it stands at `angle`: half the angle up on its side, resting on the shoulder. Null when the die does not fit. */
export function placeParent(part: PartModel, hit: Hit, die: Die, angle: number, parentInFront: boolean): { readonly placing: Placing; readonly tip: number } | null {
  const bend = hitBend(part, hit);
  const lowest = contactHeight(bend, part.thickness, die, angle);
  if (lowest === null) return null;
  const { along, across, begin, way } = stripOf(bend);
  const [cos, sin] = [Math.cos(angle / 2), Math.sin(angle / 2)];
  const side = parentInFront ? -1 : 1;
  const outer = angle === 0 ? 0 : bend.allowance / angle + (1 - bend.k) * part.thickness;
  const tangent: Point = angle === 0 ? [side * bend.allowance / 2, lowest, 0] : [side * outer * sin, lowest + outer * (1 - cos), 0];
  const outward: Point = [-side * cos, -sin, 0];
  const top: Point = [-side * way * sin, way * cos, 0];
  const alongZ = top[0] * outward[1] - top[1] * outward[0];
  const ends = hit.bends.flatMap((i) => (part.bends[i]?.line ?? []).map(([x, y]) => alongZ * (along[0] * x + along[1] * y)));
  const middle = (Math.min(...ends) + Math.max(...ends)) / 2;
  const turned: Placing = [
    outward[0] * across[0], outward[0] * across[1], top[0], 0,
    outward[1] * across[0], outward[1] * across[1], top[1], 0,
    alongZ * along[0], alongZ * along[1], 0, 0,
  ];
  const foot = move(turned, [across[0] * begin, across[1] * begin, way > 0 ? 0 : part.thickness]);
  const shift = [tangent[0] - foot[0], tangent[1] - foot[1], -middle];
  return { placing: turned.map((value, i) => (i % 4 === 3 ? shift[(i - 3) / 4] ?? 0 : value)), tip: lowest + part.thickness };
}

/** The whole part at a moment of the stroke, every face placed. */
export function placePart(part: PartModel, hit: Hit, die: Die, angle: number): PlacedPart | null {
  const bend = hitBend(part, hit);
  const parent = placeParent(part, hit, die, angle, sidesOf(part, hit)[bend.parent] === true);
  if (!parent) return null;
  const at = angleOf(part, hit, angle);
  const folded: Placing[] = [UNMOVED];
  part.bends.forEach((one, i) => { folded[one.child] = after(folded[one.parent] ?? UNMOVED, rolled(one, part.thickness, at(i))); });
  const toParent = backwards(folded[bend.parent] ?? UNMOVED);
  const base = after(parent.placing, toParent);
  return { faces: folded.map((face) => after(base, face)), tip: parent.tip };
}

function backwards(m: Placing): Placing {
  const at = (i: number) => m[i] ?? 0;
  const row = (i: number) => [at(i), at(4 + i), at(8 + i)] as const;
  return [0, 1, 2].flatMap((i) => {
    const [x, y, z] = row(i);
    return [x, y, z, -(x * at(3) + y * at(7) + z * at(11))];
  });
}
