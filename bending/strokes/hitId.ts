/** The name of one stroke of a bend that several make: "rim hit 3/9". */
export const hitId = (bend: string, number: number, of: number): string => `${bend} hit ${number}/${of}`;

/** The bend that a stroke's name belongs to, and which stroke of how many; null for a bend that one stroke makes. */
export function readHitId(id: string): { readonly bend: string; readonly number: number; readonly of: number } | null {
  const found = /^(.*) hit (\d+)\/(\d+)$/.exec(id);
  return found === null ? null : { bend: found[1] ?? "", number: Number(found[2]), of: Number(found[3]) };
}
