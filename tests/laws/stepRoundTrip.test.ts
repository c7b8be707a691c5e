import { readFileSync } from "node:fs";
import { join } from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import { checkFolded } from "@/bending/exchange/step/checkFolded";
import { toPartDocument } from "@/bending/exchange/step/toPartDocument";
import { flatPattern } from "@/bending/part/flatPattern";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import { loadKernel, type LoadedKernel } from "@/lib/step/loadKernel";
import { mustBuild } from "../step/mustBuild";
import { mustRead } from "../step/mustRead";
import { solidOfPart } from "../step/solidOfPart";
import { stepOfShape } from "../step/stepOfShape";
import { turnedFrame } from "../step/turnedFrame";

let loaded: LoadedKernel;
beforeAll(async () => {
  loaded = await loadKernel();
});

const corpus = (name: string): PartDocument => JSON.parse(readFileSync(join(import.meta.dirname, `../corpus/plans/${name}.json`), "utf8")) as PartDocument;

const head = { format: "part/1", name: "Part", units: "mm", material: "S235", thickness: 1.5, insideRadius: 2 } as const;

/** Holes of each kind, a tapered flange, a return, a down bend, reliefs and insets. */
const busy: PartDocument = {
  ...head,
  base: {
    outline: [[0, 0], [200, 0], [200, 90], [170, 120], [0, 120]],
    holes: [{ circle: [100, 60], diameter: 20 }, { slot: [[30, 40], [30, 80]], width: 8 }, { polygon: [[140, 40], [170, 40], [170, 60, 1], [150, 60], [140, 55]] }],
  },
  flanges: [
    { id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up", start: 20, end: 30, startAngle: 80, relief: { kind: "rectangular" }, holes: [{ circle: [70, 18], diameter: 6 }] },
    { id: "return", on: "front", edge: 2, length: 14, angle: 120, direction: "up", insideRadius: 3 },
    { id: "side", on: "base", edge: 4, length: 40, angle: 45, direction: "down", insideRadius: 1, start: 10, end: 10, relief: { kind: "round" } },
  ],
};

const bendFacts = (part: PartModel) => part.bends.map(({ angle, insideRadius }) => [angle, insideRadius] as const).sort((a, b) => a[0] - b[0] || a[1] - b[1]);

/** Writes the folded part as a STEP file, reads it, and unfolds by the same rule. */
function thereAndBack(document: PartDocument, place = turnedFrame([0, 0, 0], [0, 0, 0])) {
  const part = mustBuild(document);
  const found = mustRead(loaded, stepOfShape(loaded.kernel, solidOfPart(loaded.kernel, part, place)));
  const again = mustBuild(toPartDocument(found, { name: "Again", material: document.material, ...(document.rule ? { rule: document.rule } : {}), ...(document.kFactor === undefined ? {} : { kFactor: document.kFactor }) }));
  return { part, found, again };
}

function expectSame({ part, found, again }: ReturnType<typeof thereAndBack>, areaDigits: number): void {
  expect(found.thickness).toBeCloseTo(part.thickness, 6);
  expect([found.leftOut, found.notes]).toEqual([[], []]);
  expect(found.volume / found.solidVolume).toBeCloseTo(1, 6);
  expect(bendFacts(again).map((facts) => facts.map((value) => Math.round(value * 1e6)))).toEqual(bendFacts(part).map((facts) => facts.map((value) => Math.round(value * 1e6))));
  expect(checkFolded(again, found).farthest).toBeLessThan(1e-3);
  expect(flatPattern(again).area).toBeCloseTo(flatPattern(part).area, areaDigits);
}

describe("a folded part that is written as a STEP file and read back", () => {
  test.each(["u", "tray-returns", "tabs", "hat", "no-radius"])("has the thickness, bends and flat that it had: %s", (name) => {
    expectSame(thereAndBack(corpus(name)), 4);
  });

  test("keeps its holes, reliefs and slanted sides as they are, wherever it lies", () => {
    const round = thereAndBack(busy, turnedFrame([0.4, -1.1, 2.3], [300, -120, 55]));
    expectSame(round, 1);
    const [base] = round.found.plates;
    expect(base?.holes.map((hole) => Object.keys(hole)[0]).sort()).toEqual(["circle", "polygon", "slot"]);
    expect(base?.holes.flatMap((hole) => ("diameter" in hole ? [hole.diameter] : "width" in hole ? [hole.width] : []))).toEqual(expect.arrayContaining([expect.closeTo(20, 6), expect.closeTo(8, 6)]));
    expect(round.found.bends.map(({ direction }) => direction).sort()).toEqual(["down", "up", "up"]);
    expect(flatPattern(round.again).holes).toHaveLength(flatPattern(round.part).holes.length);
  });
});
