import type { FlangeDraft } from "./partDraft";

export interface FlangeRow { readonly flange: FlangeDraft; readonly index: number; readonly depth: number }

/** Flanges in tree order: children under the face that carries them; what hangs on a missing face comes last. */
export function flangeTree(flanges: readonly FlangeDraft[]): readonly FlangeRow[] {
  const rows: FlangeRow[] = [];
  const placed = new Set<number>();
  const under = (face: string, depth: number) => flanges.forEach((flange, index) => {
    if (flange.on !== face || placed.has(index)) return;
    placed.add(index);
    rows.push({ flange, index, depth });
    under(flange.id, depth + 1);
  });
  under("base", 0);
  flanges.forEach((flange, index) => { if (!placed.has(index)) rows.push({ flange, index, depth: 0 }); });
  return rows;
}

/** Keys of a flange and of everything that hangs on it. */
export function keysOfBranch(flanges: readonly FlangeDraft[], key: string): ReadonlySet<string> {
  const keys = new Set([key]);
  let grown = true;
  while (grown) {
    const ids = new Set(flanges.filter((flange) => keys.has(flange.key)).map((flange) => flange.id));
    const more = flanges.filter((flange) => !keys.has(flange.key) && ids.has(flange.on));
    for (const flange of more) keys.add(flange.key);
    grown = more.length > 0;
  }
  return keys;
}
