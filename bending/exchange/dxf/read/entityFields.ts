import { DXF_LIMITS } from "./dxfLimits";
import type { RawEntity } from "./rawEntity";

export interface EntityFields {
  /** The number of a group; without a fallback the group must be there. NaN when wrong. */
  readonly number: (code: number, what: string, fallback?: number) => number;
  readonly text: (code: number) => string | null;
  /** Every value of a group, in order. */
  readonly numbers: (code: number, what: string) => readonly number[];
  /** The first thing that was wrong. */
  readonly problem: () => { readonly line: number; readonly message: string } | null;
}

/** Takes values out of an entity and remembers the first that is missing or no number. */
export function entityFields(raw: RawEntity): EntityFields {
  let problem: { readonly line: number; readonly message: string } | null = null;
  const wrong = (line: number, message: string): number => {
    problem ??= { line, message };
    return NaN;
  };
  const parse = (value: string, line: number, code: number, what: string): number => {
    const number = value.trim() === "" ? NaN : Number(value);
    if (!Number.isFinite(number)) return wrong(line, `${raw.kind}: ${what} (group ${code}) must be a number, but there stands "${value.trim().slice(0, 30)}"`);
    if (Math.abs(number) > DXF_LIMITS.coordinate) return wrong(line, `${raw.kind}: ${what} (group ${code}) is ${number}, beyond ${DXF_LIMITS.coordinate}`);
    return number;
  };
  // Extended data (codes from 1000) is not the entity's own.
  const find = (code: number) => raw.tags.find((tag) => tag.code === code);
  return {
    number: (code, what, fallback) => {
      const tag = find(code);
      if (tag) return parse(tag.value, tag.line, code, what);
      return fallback ?? wrong(raw.line, `${raw.kind}: ${what} (group ${code}) is missing`);
    },
    text: (code) => find(code)?.value ?? null,
    numbers: (code, what) => raw.tags.filter((tag) => tag.code === code).map((tag) => parse(tag.value, tag.line, code, what)),
    problem: () => problem,
  };
}
