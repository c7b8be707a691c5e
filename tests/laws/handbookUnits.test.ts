import { readFileSync, readdirSync } from "node:fs";
import { join } from "node:path";
import fc from "fast-check";
import { expect, test } from "vitest";
import { MM_PER_INCH } from "@/bending";
import { PURE_NUMBERS, scaledDoors, sizedDoors, type Door, type Sizes } from "./handbookDoors";

const folder = join(import.meta.dirname, "../../bending/handbook");
const LENGTHS = /\b(Mm|DieOpening|BendState|Lift|AllowanceQuestion|DieFacts)\b/;

/** Files with a function of their own name that takes a length, and the function. */
const doors = new Map(await Promise.all(readdirSync(folder).filter((file) => file.endsWith(".ts") && !file.endsWith(".test.ts")).map(async (file) => {
  const name = file.slice(0, -3);
  const head = new RegExp(`export function ${name}\\(([^\\n]*)\\)`).exec(readFileSync(join(folder, file), "utf8"))?.[1] ?? "";
  const made = (await import(`../../bending/handbook/${name}.ts`)) as Readonly<Record<string, unknown>>;
  return [name, LENGTHS.test(head) ? made[name] : undefined] as const;
})).then((found) => found.filter(([, made]) => made !== undefined)));

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const sizes: fc.Arbitrary<Sizes> = fc.record({
  thickness: between(0.4, 12), radius: between(0.5, 30), opening: between(4, 120), shoulder: between(0.3, 5), length: between(5, 600), angle: between(0.05, 3), choice: fc.nat(41),
});

type Leaf = readonly [path: string, value: number | boolean];

function leaves(value: unknown, path = ""): readonly Leaf[] {
  if (typeof value === "number" || typeof value === "boolean") return [[path, value]];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, part]) => leaves(part, path === "" ? key : `${path}.${key}`));
}

/** The answer in mm to lengths in mm, and to the same lengths all given in inches. */
function both(name: string, { args, power = 1 }: Door, size: Sizes): readonly (readonly [path: string, inMm: number, inInch: number])[] {
  const ask = doors.get(name) as (...given: readonly unknown[]) => unknown;
  const [inMm, inInch] = [leaves(ask(...args(size, (length) => length))), leaves(ask(...args(size, (length) => length / MM_PER_INCH)))];
  return inMm.flatMap(([path, value], i) => {
    const key = path.split(".").filter((part) => !/^\d+$/.test(part)).at(-1) ?? "";
    // Yes or no inside an answer are of the sheet's own size, e.g. whether a die suits it.
    if (typeof value === "boolean" && path !== "") return [];
    const other = inInch[i]?.[1];
    return [[path, Number(value), Number(other ?? NaN) * (PURE_NUMBERS.has(key) ? 1 : MM_PER_INCH ** power)] as const];
  });
}

const near = (one: number, other: number) => Math.abs(one - other) <= 1e-9 * Math.max(1, Math.abs(one));

test("every door that takes a length is either one that any unit suits or one that reads sizes in mm", () => {
  expect([...Object.keys(scaledDoors), ...Object.keys(sizedDoors)].sort()).toEqual([...doors.keys()].sort());
});

test.each(Object.entries(scaledDoors))("%s: inches and millimetres give the same answer", (name, door) => {
  fc.assert(fc.property(sizes, (size) => {
    for (const [path, inMm, inInch] of both(name, door, size)) expect([path, near(inMm, inInch), inMm, inInch]).toEqual([path, true, inMm, inInch]);
  }), { numRuns: 30 });
});

test.each(Object.entries(sizedDoors))("%s: reads sizes in mm, so an inch number would be taken for another sheet", (name, door) => {
  const samples = fc.sample(sizes, { numRuns: 60, seed: 1 });
  const differs = samples.some((size) => {
    const answers = both(name, door, size);
    return answers.length > 0 && answers.some(([, inMm, inInch]) => !near(inMm, inInch));
  });
  expect(differs).toBe(true);
});
