import { readHitId } from "./hitId";

const STRIP = " strip";

/** The drawn bend that a stroke's bend belongs to; the id itself when one stroke makes it. */
export const drawnBend = (id: string): string => readHitId(id)?.bend ?? id;

/** The plane strip behind a stroke of a row, and which stroke; null for a drawn face. */
export function readStrip(id: string): { readonly bend: string; readonly number: number; readonly of: number } | null {
  return id.endsWith(STRIP) ? readHitId(id.slice(0, -STRIP.length)) : null;
}

export const stripId = (hit: string): string => `${hit}${STRIP}`;
