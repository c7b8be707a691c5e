import type { ValueChange } from "@/lib/schemas/materialViews";

/** The most that is written into one line of the record. */
const MOST = 500;

/** Changes and why, for the record: "yield (MPa): 235 -> 240; new certificate". */
export function changeWords(changes: readonly ValueChange[], note: string): string {
  const said = changes.map(({ field, from, to }) => `${field}: ${from === "" ? "empty" : from} -> ${to === "" ? "empty" : to}`).join(", ");
  const whole = note === "" ? said : `${said}; ${note}`;
  return whole.length > MOST ? `${whole.slice(0, MOST - 1)}…` : whole;
}
