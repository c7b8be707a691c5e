/** A group as it is written: its code and value. */
export type Tag = readonly [code: number, value: string | number];

/** Digits behind the point: a millionth of a millimetre for lengths, more for angles and bulges. */
const DIGITS = 9;

const number = (value: number): string => (Number.isInteger(value) ? String(value) : String(Number(value.toFixed(DIGITS))));

/** Codes whose values are whole numbers; every other number is written as a real number. */
const whole = (code: number): boolean => (code >= 60 && code <= 99) || (code >= 170 && code <= 179) || (code >= 270 && code <= 289) || (code >= 370 && code <= 389) || code === 1070 || code === 1071;

/** Characters beyond ASCII as DXF writes them (\U+00E4), so that no code page matters; control characters as spaces. */
const ascii = (text: string): string => text.replace(/\p{Cc}/gu, " ").replace(/[^\x20-\x7e]/g, (sign) => `\\U+${sign.charCodeAt(0).toString(16).toUpperCase().padStart(4, "0")}`);

/** The text of groups, a code and a value a line each. */
export function writeTags(tags: readonly Tag[]): string {
  return tags.map(([code, value]) => `${String(code).padStart(3)}\r\n${typeof value === "string" ? ascii(value) : whole(code) ? value : real(number(value))}\r\n`).join("");
}

const real = (text: string): string => (/[.e]/.test(text) ? text : `${text}.0`);
