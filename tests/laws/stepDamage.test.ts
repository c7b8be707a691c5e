import { afterAll, beforeAll, expect, test } from "vitest";
import { loadKernel } from "@/lib/step/loadKernel";
import { STEP_LIMITS } from "@/lib/step/stepLimits";
import { createReader } from "../step/createReader";
import { mustBuild } from "../step/mustBuild";
import { solidOfPart } from "../step/solidOfPart";
import { stepOfShape } from "../step/stepOfShape";

/** A file that leads the kernel in a circle is ended here; it takes a part of a second otherwise. */
const reader = createReader(8_000);
afterAll(() => reader.end());

let whole: Buffer;
beforeAll(async () => {
  const { kernel } = await loadKernel();
  const part = mustBuild({
    format: "part/1", name: "Angle", units: "mm", material: "S235", thickness: 2, insideRadius: 3,
    base: { outline: [[0, 0], [60, 0], [60, 40], [0, 40]], holes: [{ circle: [20, 22], diameter: 8 }] },
    flanges: [{ id: "up", on: "base", edge: 0, length: 25, angle: 90, direction: "up" }],
  });
  whole = Buffer.from(stepOfShape(kernel, solidOfPart(kernel, part)));
});

/** Numbers that look random and are the same at every run. */
function numbersFrom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1_664_525 + 1_013_904_223) % 4_294_967_296;
    return state / 4_294_967_296;
  };
}

/** Of each kind of damage. */
const ROUNDS = 15;

type Damage = (file: Buffer, random: () => number) => Buffer;
const at = (file: Buffer, random: () => number) => Math.floor(random() * file.length);
const replaced = (pattern: RegExp, by: (found: string, random: () => number) => string): Damage => (file, random) => {
  const text = file.toString("latin1");
  const places = [...text.matchAll(pattern)];
  const place = places[Math.floor(random() * places.length)];
  if (!place) return file;
  return Buffer.from(text.slice(0, place.index) + by(place[0], random) + text.slice(place.index + place[0].length), "latin1");
};

const damages: Readonly<Record<string, Damage>> = {
  "cut off": (file, random) => file.subarray(0, at(file, random)),
  "cut off and closed again": (file, random) => Buffer.concat([file.subarray(0, at(file, random)), Buffer.from("\nENDSEC;\nEND-ISO-10303-21;\n")]),
  "swapped bytes": (file, random) => {
    const damaged = Buffer.from(file);
    for (let i = 0; i < 20; i += 1) {
      const [a, b] = [at(file, random), at(file, random)];
      [damaged[a], damaged[b]] = [damaged[b] ?? 0, damaged[a] ?? 0];
    }
    return damaged;
  },
  "noise": (file, random) => {
    const damaged = Buffer.from(file);
    const start = at(file, random);
    for (let i = start; i < Math.min(file.length, start + 40); i += 1) damaged[i] = Math.floor(random() * 256);
    return damaged;
  },
  "a huge number": replaced(/-?\d+\.\d*(?:E[+-]?\d+)?/g, (_, random) => ["1.E300", "-9.9E99", "1.E15", "1.E-300", "NaN", "1.E999"][Math.floor(random() * 6)] ?? "0."),
  "another entity's number": replaced(/#\d+/g, (_, random) => `#${Math.floor(random() * 900)}`),
  "an entity left out": replaced(/#\d+ = [^;]*;/g, () => ""),
  "a missing bracket": replaced(/[()]/g, () => ""),
};

test.each(Object.entries(damages))("a damaged file is read, refused or ended, and nothing falls: %s", async (name, damage) => {
  const random = numbersFrom(name.length * 7919 + 1);
  let ended = 0;
  for (let round = 0; round < ROUNDS; round += 1) {
    const answer = await reader.read(damage(whole, random));
    if (answer === null) ended += 1;
    else {
      expect(answer.ok ? ["part", "choose"].includes(answer.kind) : (answer.message?.length ?? 0) > 20).toBe(true);
      expect(answer.kernelBytes).toBeLessThanOrEqual(STEP_LIMITS.kernelBytes);
    }
  }
  expect(ended).toBeLessThan(ROUNDS / 2);
}, 180_000);
