import type { Cure } from "./finding";

/** The document (or a part of it that begins the cure's path) with the one field changed that a cure names; everything else stays the same object. */
export function applyCure<T>(document: T, cure: Cure): T {
  const steps = cure.path.replaceAll("]", "").split(/[.[]/);
  return changed(document, steps, cure.value) as T;
}

function changed(value: unknown, [step, ...rest]: readonly string[], to: unknown): unknown {
  if (step === undefined) return to;
  if (Array.isArray(value)) return value.map((one: unknown, i) => (String(i) === step ? changed(one, rest, to) : one));
  const object = (typeof value === "object" && value !== null ? value : {}) as Readonly<Record<string, unknown>>;
  return { ...object, [step]: changed(object[step], rest, to) };
}
