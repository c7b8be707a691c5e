import type { PartModel } from "../part/partModel";

/** The bends on the way through the part's tree from one face to another, in no promised order, and whether the way goes from parent to child. */
export function bendsBetween(part: PartModel, from: number, to: number): readonly { readonly bend: number; readonly outwards: boolean }[] {
  const [up, down] = [toBase(part, from), toBase(part, to)];
  const shared = new Set(up.filter((bend) => down.includes(bend)));
  const own = (bend: number) => !shared.has(bend);
  return [...up.filter(own).map((bend) => ({ bend, outwards: false })), ...down.filter(own).map((bend) => ({ bend, outwards: true }))];
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
