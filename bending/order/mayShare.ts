/** Can two steps stand at one gauge setting, when each may have one of these (null: any)? */
export function mayShare(a: readonly number[] | null, b: readonly number[] | null): boolean {
  if (a === null || b === null) return true;
  for (const setting of a) if (b.includes(setting)) return true;
  return false;
}
