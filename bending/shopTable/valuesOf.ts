import type { ShopTable } from "./shopCell";

/** The values of one material without the trials behind them: enough to compute with, to send and to compare. */
export function valuesOf({ cells }: ShopTable, material: string): ShopTable {
  return { cells: cells.flatMap((cell) => (cell.material === material && cell.value !== null ? [{ ...cell, trials: [] }] : [])), refused: [] };
}
