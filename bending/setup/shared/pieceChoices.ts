import type { Interval } from "../../geometry/interval";
import type { PieceStock } from "./createPieceStock";

/** So many pieces of each kind of a stock, with the length that they make side by side. */
export interface PieceChoice {
  readonly counts: readonly number[];
  readonly length: number;
}

/** Every choice of exactly `count` of the pieces that are left whose length comes into the span, gaps up to `maxGap` between them. */
export function pieceChoices({ kinds }: PieceStock, left: readonly number[], count: number, [least, most]: Interval, maxGap: number): readonly PieceChoice[] {
  const found: PieceChoice[] = [];
  const counts = kinds.map(() => 0);
  const stretch = (count - 1) * maxGap + 1e-6;
  const choose = (kind: number, missing: number, length: number): void => {
    if (missing === 0) {
      if (length + stretch >= least) found.push({ counts: [...counts], length });
      return;
    }
    const one = kinds[kind];
    if (one === undefined || length + missing * one.length + stretch < least) return;
    const many = Math.min(missing, left[kind] ?? 0, Math.floor((most + 1e-6 - length) / one.length));
    for (let taken = many; taken >= 0; taken -= 1) {
      counts[kind] = taken;
      choose(kind + 1, missing - taken, length + taken * one.length);
    }
    counts[kind] = 0;
  };
  choose(0, count, 0);
  return found;
}
