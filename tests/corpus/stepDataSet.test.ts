import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import { checkFolded } from "@/bending/exchange/step/checkFolded";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { toPartDocument } from "@/bending/exchange/step/toPartDocument";
import { polygonCentroid } from "@/bending/geometry/polygonCentroid";
import type { Vec2 } from "@/bending/geometry/vec2";
import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import { flatPattern } from "@/bending/part/flatPattern";
import { loadKernel, type LoadedKernel } from "@/lib/step/loadKernel";
import { readStep } from "@/lib/step/readStep";

/** An open data set of folded and unfolded sheet-metal parts (arXiv 2603.13102), which stands beside the project when it is there at all. */
const folder = join(import.meta.dirname, "../../../shared/data/step");
const numbers = ["0", "1", "2"].filter((number) => existsSync(join(folder, `${number}.stp`)));

interface SequenceEntry {
  readonly face_name?: string;
  readonly part_thickness?: number;
  readonly bend_angle: number;
  readonly bend_radius: number;
  readonly orientation: string;
}
const json = <T>(name: string): T => JSON.parse(readFileSync(join(folder, name), "utf8")) as T;

let loaded: LoadedKernel;
beforeAll(async () => {
  if (numbers.length > 0) loaded = await loadKernel();
});

const known = new Map<string, RecognisedPart>();

function recognised(name: string): RecognisedPart {
  const before = known.get(name);
  if (before) return before;
  const read = readStep(loaded, readFileSync(join(folder, name)));
  if (!read.ok || read.value.kind !== "part") throw new Error(JSON.stringify(read));
  known.set(name, read.value.part);
  return read.value.part;
}

function built(part: RecognisedPart, kFactor: number) {
  const made = buildPart(toPartDocument(part, { name: "part", material: "S235", kFactor }), { materials: materialById });
  if (!made.ok) throw new Error(JSON.stringify(made.error));
  return made.value;
}

if (numbers.length === 0) test("the data set does not stand beside the project, so nothing is compared with it", () => {
  expect(existsSync(folder)).toBe(false);
});

describe.each(numbers)("part %s of the data set", (number) => {
  test("has the thickness, bends, angles and radii that it was built with, and folds back into its solid", () => {
    const [plate, ...sequence] = json<readonly SequenceEntry[]>(`${number}_sequence.json`);
    const labels = json<{ readonly total_bends: number; readonly part_volume_3d: number }>(`${number}_labels.json`);
    const part = recognised(`${number}.stp`);
    expect(part.thickness).toBeCloseTo(plate?.part_thickness ?? 0, 6);
    expect(part.bends).toHaveLength(labels.total_bends);
    const sorted = (bends: readonly (readonly [number, number])[]) => [...bends].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
    const found = sorted(part.bends.map(({ angle, insideRadius }) => [(angle * 180) / Math.PI, insideRadius] as const).map(([angle, radius]) => [Math.round(angle * 1e4) / 1e4, Math.round(radius * 1e4) / 1e4]));
    expect(found).toEqual(sorted(sequence.map(({ bend_angle, bend_radius }) => [bend_angle, bend_radius])));
    // Of the bends on the base, as many turn one way as in the sequence; which of its sides is the top is free.
    const ways = (up: number, all: number) => [up, all - up].sort();
    const onBase = sequence.filter(({ face_name }) => face_name === "base");
    const foundOnBase = part.bends.filter(({ parent }) => parent === 0);
    expect(ways(foundOnBase.filter(({ direction }) => direction === "up").length, foundOnBase.length)).toEqual(ways(onBase.filter(({ orientation }) => orientation === "up").length, onBase.length));
    expect([part.leftOut, part.notes, part.roles.includes("left out")]).toEqual([[], [], false]);
    expect(part.solidVolume).toBeCloseTo(labels.part_volume_3d * 1000, 3);
    expect(part.volume / part.solidVolume).toBeCloseTo(1, 9);
    expect(checkFolded(built(part, 0.4), part).farthest).toBeLessThan(1e-5);
  });

  test("has the flat of its unfolded file once that file's neutral line is taken", () => {
    const part = recognised(`${number}.stp`);
    const plate = recognised(`${number}_unfolded.stp`);
    expect([plate.bends.length, plate.thickness]).toEqual([0, expect.closeTo(part.thickness, 6)]);
    const given = flatPattern(built(plate, 0.4));
    // Area grows by angle x thickness x length for each whole K: two areas give the neutral line.
    const perK = part.bends.reduce((sum, { angle, length }) => sum + angle * length * part.thickness, 0);
    const k = (given.area - flatPattern(built(part, 0.4)).area) / perK + 0.4;
    expect(k).toBeGreaterThan(0.3);
    expect(k).toBeLessThan(0.5);
    const flat = flatPattern(built(part, k));
    expect(flat.area).toBeCloseTo(given.area, 2);
    // Corner by corner, whichever way the two lie: the distances from the sheet's centroid agree.
    const [ours, theirs] = [cornerReaches(flat.outline), cornerReaches(given.outline)];
    expect(ours).toHaveLength(theirs.length);
    ours.forEach((distance, i) => expect(distance).toBeCloseTo(theirs[i] ?? 0, 3));
  });
});

/** How far the corners of an outline are from the centroid, in order of size; points along straight edges and arcs left out. */
function cornerReaches(outline: readonly Vec2[]): readonly number[] {
  const [cx, cy] = polygonCentroid(outline);
  return outline.filter((q, i) => {
    const [p, r] = [outline[(i + outline.length - 1) % outline.length] ?? q, outline[(i + 1) % outline.length] ?? q];
    const turn = Math.atan2((q[0] - p[0]) * (r[1] - q[1]) - (q[1] - p[1]) * (r[0] - q[0]), (q[0] - p[0]) * (r[0] - q[0]) + (q[1] - p[1]) * (r[1] - q[1]));
    return Math.abs(turn) > 0.15;
  }).map(([x, y]) => Math.hypot(x - cx, y - cy)).sort((a, b) => a - b);
}
