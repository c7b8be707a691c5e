import { fail, ok, type Result } from "../core/result";

/** An option's number within limits, or the fallback when it is not given. */
export function readNumber(options: ReadonlyMap<string, string>, name: string, fallback: number, limits: { readonly least: number; readonly most: number; readonly whole: boolean }): Result<number, string> {
  const text = options.get(name);
  if (text === undefined) return ok(fallback);
  const value = Number(text);
  const { least, most, whole } = limits;
  if (!Number.isFinite(value) || text.trim() === "" || (whole && !Number.isInteger(value)) || value < least || value > most) {
    return fail(`${name}: "${text}" is not a ${whole ? "whole " : ""}number from ${least} to ${most}`);
  }
  return ok(value);
}
