import type { PartModel } from "../part/partModel";

/** The bends on the way through the part's tree from one face to another, in no promised order. */
export function bendsBetween(part: PartModel, one: number, other: number): readonly number[] {
  const [up, down] = [toBase(part, one), toBase(part, other)];
  const shared = new Set(up.filter((bend) => down.includes(bend)));
  return [...up, ...down].filter((bend) => !shared.has(bend));
}

function toBase(part: PartModel, face: number): readonly number[] {
  const bends: number[] = [];
  for (let bend = part.faces[face]?.bend ?? null; bend !== null;) {
    bends.push(bend);
    const parent: number | undefined = part.bends[bend]?.parent;
    bend = part.faces[parent ?? -1]?.bend ?? null;
  }
  return bends;
}
