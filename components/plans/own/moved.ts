/** The list with the entry at `from` put at `to`; out of reach: as it was. */
export function moved<T>(list: readonly T[], from: number, to: number): readonly T[] {
  const entry = list[from];
  if (entry === undefined || to < 0 || to >= list.length) return list;
  const others = list.filter((_, index) => index !== from);
  return [...others.slice(0, to), entry, ...others.slice(to)];
}
