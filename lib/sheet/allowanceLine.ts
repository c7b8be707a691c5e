import type { SheetFlat } from "./sheetView";

/** "b1, b2 3.12 mm (DIN 6935); b3 ...": bends that have the same allowance from the same source stand together. */
export function allowanceLine({ bends }: Pick<SheetFlat, "bends">): string {
  const alike = new Map<string, string[]>();
  for (const bend of bends) {
    const value = `${bend.allowance} (${bend.source})`;
    alike.set(value, [...(alike.get(value) ?? []), bend.id]);
  }
  return [...alike].map(([value, ids]) => `${ids.join(", ")} ${value}`).join("; ");
}
