import type { TopoDS_Shape } from "replicad-opencascadejs";
import { beforeAll, describe, expect, test } from "vitest";
import { importedDocument } from "@/bending/exchange/step/importedDocument";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { toPartDocument } from "@/bending/exchange/step/toPartDocument";
import { identityFrame } from "@/bending/geometry/identityFrame";
import { signedArea } from "@/bending/geometry/signedArea";
import { materialById } from "@/bending/handbook/materials";
import { flatPattern } from "@/bending/part/flatPattern";
import type { BulgeVertex } from "@/bending/part/partModel";
import type { Kernel } from "@/lib/step/kernel";
import { loadKernel, type LoadedKernel } from "@/lib/step/loadKernel";
import { readStep } from "@/lib/step/readStep";
import { mustBuild } from "../step/mustBuild";
import { mustRead } from "../step/mustRead";
import { plateSolid, solidOfPart } from "../step/solidOfPart";
import { stepOfShape } from "../step/stepOfShape";

let loaded: LoadedKernel;
let kernel: Kernel;
beforeAll(async () => {
  loaded = await loadKernel();
  kernel = loaded.kernel;
});

const head = { format: "part/1", name: "Angle", units: "mm", material: "S235", thickness: 2, insideRadius: 3 } as const;
const square: readonly BulgeVertex[] = [[0, 0, 0], [60, 0, 0], [60, 40, 0], [0, 40, 0]];
const angle = () => solidOfPart(kernel, mustBuild({ ...head, profile: { width: 60, legs: [40, 30], bends: [{ angle: 90, direction: "up" }] } }));
const box = (from: readonly [number, number, number], size: readonly [number, number, number]): TopoDS_Shape =>
  new kernel.BRepPrimAPI_MakeBox(new kernel.gp_Pnt(...from), size[0], size[1], size[2]).Shape();
const cut = (a: TopoDS_Shape, b: TopoDS_Shape) => new kernel.BRepAlgoAPI_Cut(a, b, new kernel.Message_ProgressRange()).Shape();
const joined = (a: TopoDS_Shape, b: TopoDS_Shape) => new kernel.BRepAlgoAPI_Fuse(a, b, new kernel.Message_ProgressRange()).Shape();
const read = (shape: TopoDS_Shape): RecognisedPart => mustRead(loaded, stepOfShape(kernel, shape));
const refused = (bytes: Uint8Array) => {
  const answer = readStep(loaded, bytes);
  return answer.ok ? null : [answer.error.kind, answer.error.message];
};
const upright = (x: number, y: number, z: number) => new kernel.gp_Ax2(new kernel.gp_Pnt(x, y, z), new kernel.gp_Dir(0, 0, 1), new kernel.gp_Dir(1, 0, 0));

describe("what a solid may be", () => {
  test("a flat plate without any bend", () => {
    const part = read(plateSolid(kernel, identityFrame, 2, square, [{ kind: "circle", centre: [30, 20], radius: 5 }]));
    expect([part.thickness, part.bends.length, part.plates[0]?.holes]).toEqual([expect.closeTo(2, 9), 0, [{ circle: [expect.closeTo(30, 9), expect.closeTo(20, 9)], diameter: expect.closeTo(10, 9) }]]);
  });

  test("sharp inside and outside: taken with inside radius 0, and said", () => {
    const part = read(joined(box([0, 0, 0], [60, 40, 2]), box([0, 0, 0], [60, 2, 30])));
    expect(part.bends).toMatchObject([{ insideRadius: 0, angle: expect.closeTo(Math.PI / 2, 9), direction: "up" }]);
    expect(part.notes.join()).toContain("sharp inside and outside");
    // Outside round instead of sharp: a quarter of (4 - pi) t² less, over the length.
    expect(part.solidVolume - part.volume).toBeCloseTo((1 - Math.PI / 4) * 4 * 60, 6);
  });

  test("bent over a stud: the stud is left out and named, the rest is there", () => {
    const stud = new kernel.BRepPrimAPI_MakeCylinder(upright(15, 30, 2), 4, 10).Shape();
    const part = read(joined(angle(), stud));
    expect([part.bends.length, part.leftOut.length]).toEqual([1, 1]);
    expect(part.leftOut[0]?.message).toMatch(/^Faces \d+, \d+: .*such as a stud/);
    expect(part.leftOut[0]?.faces.every((face) => part.roles[face] === "left out")).toBe(true);
  });

  test("milled thinner in a pocket: the pocket is left out and named", () => {
    const part = read(cut(plateSolid(kernel, identityFrame, 4, square, []), box([10, 10, 3], [20, 20, 5])));
    expect(part.thickness).toBeCloseTo(4, 9);
    expect(part.leftOut.map(({ message }) => message).join()).toContain("another thickness");
  });

  test("with a countersunk hole: the hole is kept at its narrow side, the cone named", () => {
    const profile = [[3, 0], [5, 2], [0, 2], [0, 0]] as const;
    const wire = new kernel.BRepBuilderAPI_MakeWire();
    profile.forEach(([x, z], i) => {
      const [u, w] = profile[(i + 1) % profile.length] ?? [x, z];
      wire.Add(new kernel.BRepBuilderAPI_MakeEdge(new kernel.gp_Pnt(30 + x, 20, z), new kernel.gp_Pnt(30 + u, 20, w)).Edge());
    });
    const axis = new kernel.gp_Ax1(new kernel.gp_Pnt(30, 20, 0), new kernel.gp_Dir(0, 0, 1));
    const sink = new kernel.BRepPrimAPI_MakeRevol(new kernel.BRepBuilderAPI_MakeFace(wire.Wire(), true).Face(), axis, 2 * Math.PI, true).Shape();
    const part = read(cut(plateSolid(kernel, identityFrame, 2, square, []), sink));
    expect(part.plates[0]?.holes).toEqual([{ circle: [expect.closeTo(30, 6), expect.closeTo(20, 6)], diameter: expect.closeTo(6, 6) }]);
    expect(part.leftOut.map(({ message }) => message).join()).toContain("countersink");
    expect(part.notes.join()).toContain("wider on one side");
  });
});

test("a slot across a bend is kept, and the flat is that of the part with the slot in it", () => {
  const part = read(cut(angle(), box([25, 20, -5], [40, 10, 17])));
  expect(part.bends.map(({ windows, length }) => [windows.length, length])).toEqual([[1, expect.closeTo(60, 9)]]);
  expect(part.leftOut).toEqual([]);
  expect(part.volume / part.solidVolume).toBeCloseTo(1, 9);
  const model = mustBuild(importedDocument(part, { name: "Angle", material: "S235" }, { materials: materialById }));
  const closed = mustBuild(toPartDocument(part, { name: "Angle", material: "S235" }));
  // 10 wide: 10 of the leg of 40 - 5, the bend, and 7 of the leg of 30 - 5.
  const allowance = model.bends[0]?.allowance ?? 0;
  expect(model.holesAcross.map(({ bends }) => bends)).toEqual([[0]]);
  expect(flatPattern(closed).area - flatPattern(model).area).toBeCloseTo(10 * (10 + allowance + 7), 6);
});

describe.each(["up", "down"] as const)("cut-outs that end inside a bend, bent %s", (direction) => {
  /** A base of 60 x 40 with a flange of 25 at y = 0, bent to `direction`; one at y = 40, bent up, says which side is the top. */
  const solid = () => solidOfPart(kernel, mustBuild({
    ...head, dimension: "tangent", base: { outline: [[0, 0], [60, 0], [60, 40], [0, 40]] },
    flanges: [{ id: "front", on: "base", edge: 0, length: 25, angle: 90, direction }, { id: "back", on: "base", edge: 2, length: 20, angle: 90, direction: "up" }],
  }));
  const [sense, height] = direction === "up" ? [-1, 5] : [1, -3];
  /** Out of the front bend, whose axis lies at y = 0 and `height`: 10 long from x on, between two angles from the base, from one radius to another. */
  const sector = (x: number, from: number, to: number, [least, most]: readonly [number, number] = [2, 6]): TopoDS_Shape => {
    const axis = new kernel.gp_Ax1(new kernel.gp_Pnt(0, 0, height), new kernel.gp_Dir(sense, 0, 0));
    const at = (along: number, radius: number) => new kernel.gp_Pnt(along, -Math.sin(from) * radius, height + sense * Math.cos(from) * radius);
    const corners = [at(x, least), at(x + 10, least), at(x + 10, most), at(x, most)];
    const wire = new kernel.BRepBuilderAPI_MakeWire();
    corners.forEach((corner, i) => wire.Add(new kernel.BRepBuilderAPI_MakeEdge(corner, corners[(i + 1) % 4] ?? corner).Edge()));
    return new kernel.BRepPrimAPI_MakeRevol(new kernel.BRepBuilderAPI_MakeFace(wire.Wire(), true).Face(), axis, to - from, true).Shape();
  };
  const third = Math.PI / 6;
  const cuts = (...tools: readonly TopoDS_Shape[]) => read(tools.reduce(cut, solid()));

  test("begun in the base, wholly inside the bend, begun in the flange: each is kept as far as it goes", () => {
    const intoFlange = box([45, -6, height > 0 ? height : height - 7], [10, 4, 7]);
    const part = cuts(sector(5, 0, third), box([5, 0, -1], [10, 8, 4]), sector(25, third, 2 * third), sector(45, 2 * third, 3 * third), intoFlange);
    const model = mustBuild(importedDocument(part, { name: "Tray", material: "S235" }, { materials: materialById }));
    const closed = mustBuild(toPartDocument(part, { name: "Tray", material: "S235" }));
    const front = model.bends.findIndex((_, i) => (part.bends[i]?.windows.length ?? 0) > 0);
    const allowance = model.bends[front]?.allowance ?? 0;
    expect(part.bends[front]).toMatchObject({ direction, length: expect.closeTo(60, 9) });
    // Each 10 wide and a third of the quarter turn long; 8 more in the base, 7 more in the flange.
    const areas = model.holesAcross.map(({ outline }) => Math.abs(signedArea(outline)));
    expect(areas.sort((a, b) => a - b)).toEqual([0, 7, 8].map((onPlate) => expect.closeTo(10 * (onPlate + allowance / 3), 6)));
    expect(model.holesAcross.map(({ bends, faces }) => [bends, faces.length])).toEqual(expect.arrayContaining([[[front], 0], [[front], 1], [[front], 1]]));
    expect(flatPattern(closed).area - flatPattern(model).area).toBeCloseTo(10 * (15 + allowance), 6);
    expect([part.leftOut, part.volume / part.solidVolume]).toEqual([[], expect.closeTo(1, 9)]);
    expect(part.notes).toEqual([expect.stringMatching(/^3 cut-outs reach into the bend at faces \d+ and \d+: drawn in the flat/)]);
  });

  test("in one of the bend's two sides only: left closed, and said with its faces", () => {
    const part = cuts(sector(25, third, 2 * third, [4, 6]));
    expect(part.bends.map(({ windows }) => windows.length)).toEqual([0, 0]);
    expect(part.notes).toEqual([expect.stringMatching(/^A cut-out in the bend at faces \d+ and \d+ is on one of its two sides only: it is left closed/)]);
    expect(part.leftOut).toHaveLength(1);
  });

  test("at the end of the bend between the plates: taken straight, and said with its faces", () => {
    const part = cuts(sector(-5, third, 2 * third));
    expect(part.bends.map(({ length }) => length)).toEqual([expect.closeTo(60, 9), expect.closeTo(60, 9)]);
    expect(part.notes).toEqual([expect.stringMatching(/^An end of the bend at faces \d+ and \d+ is not straight/)]);
  });
});

test("a cut-out into a bend square to the base and not to the bend: taken as the base's side has it, and said", () => {
  // From 10 before the bend to 1.5 past its start, straight down: asin(1.5 / 3), a third of the quarter turn, on its inside.
  const part = read(cut(angle(), box([25, 20, -1], [11.5, 10, 4])));
  const choices = { name: "Angle", material: "S235" } as const;
  const model = mustBuild(importedDocument(part, choices, { materials: materialById }));
  expect(model.holesAcross.map(({ outline }) => Math.abs(signedArea(outline)))).toEqual([expect.closeTo(10 * (10 + (model.bends[0]?.allowance ?? 0) / 3), 6)]);
  expect(part.notes).toEqual([expect.stringContaining("A cut-out reaches into the bend"), expect.stringMatching(/^Rims of cut-outs in the bend at faces \d+ and \d+ are not square to the sheet: taken as they are on face \d+\.$/)]);
});

test("a round hole across a bend keeps its shape: between its rims it follows the bend, not a straight line", () => {
  // Drilled along the bisector of the bend, whose axis lies at x = 35, z = 5: its sides in the bend are no straight lines.
  const drill = new kernel.BRepPrimAPI_MakeCylinder(new kernel.gp_Ax2(new kernel.gp_Pnt(25, 30, 15), new kernel.gp_Dir(1, 0, -1), new kernel.gp_Dir(0, 1, 0)), 8, 40).Shape();
  const part = read(cut(angle(), drill));
  const [window] = part.bends[0]?.windows ?? [];
  const widest = window?.pieces.flatMap((piece) => (piece.on === "bend" ? piece.path.map(([along]) => along) : [])) ?? [];
  // The drill is 16 across where the bisector meets the bend.
  expect(Math.max(...widest) - Math.min(...widest)).toBeCloseTo(16, 2);
});

describe("what is no sheet-metal part", () => {
  test("a block and a ball, in plain words", () => {
    expect(refused(stepOfShape(kernel, box([0, 0, 0], [30, 30, 30])))).toEqual(["not-sheet-metal", expect.stringContaining("not a sheet-metal part")]);
    expect(refused(stepOfShape(kernel, new kernel.BRepPrimAPI_MakeSphere(20).Shape()))).toEqual(["not-sheet-metal", expect.stringContaining("no two of its faces lie back to back")]);
  });

  test("surfaces without a solid", () => {
    const face = new kernel.BRepBuilderAPI_MakeFace(new kernel.gp_Pln(new kernel.gp_Pnt(0, 0, 0), new kernel.gp_Dir(0, 0, 1)), 0, 30, 0, 20).Face();
    expect(refused(stepOfShape(kernel, face))).toEqual(["surface-model", expect.stringContaining("surfaces and no solid body")]);
  });

  test("several bodies: each is offered, and the chosen one is read", () => {
    const builder = new kernel.TopoDS_Builder();
    const both = new kernel.TopoDS_Compound();
    builder.MakeCompound(both);
    builder.Add(both, box([0, 0, 0], [20, 20, 20]));
    builder.Add(both, angle());
    const bytes = stepOfShape(kernel, both);
    const answer = readStep(loaded, bytes);
    expect(answer).toMatchObject({ ok: true, value: { kind: "choose", bodies: [{ body: 1, faces: 6, volume: expect.closeTo(8000, 3) }, { body: 2 }] } });
    expect(readStep(loaded, bytes, 2)).toMatchObject({ ok: true, value: { kind: "part", part: { bends: [{ insideRadius: expect.closeTo(3, 9) }] } } });
    expect(readStep(loaded, bytes, 3)).toMatchObject({ ok: false, error: { kind: "no-solid" } });
  });
});

test("lengths are those of the file's unit: a file in inches is 25.4 times as large as its numbers", () => {
  const bytes = stepOfShape(kernel, angle());
  const text = Buffer.from(bytes).toString("latin1");
  const inches = text.replace(/\( LENGTH_UNIT\(\) NAMED_UNIT\(\*\) SI_UNIT\(\.MILLI\.,\.METRE\.\) \)/, "( CONVERSION_BASED_UNIT('INCH',#90001) LENGTH_UNIT() NAMED_UNIT(#90003) )")
    .replace(/ENDSEC;\s*END-ISO/, "#90001=LENGTH_MEASURE_WITH_UNIT(LENGTH_MEASURE(25.4),#90002);\n#90002=( LENGTH_UNIT() NAMED_UNIT(*) SI_UNIT(.MILLI.,.METRE.) );\n#90003=DIMENSIONAL_EXPONENTS(1.,0.,0.,0.,0.,0.,0.);\nENDSEC;\nEND-ISO");
  expect(inches).not.toBe(text);
  expect(mustRead(loaded, Buffer.from(inches, "latin1")).thickness).toBeCloseTo(2 * 25.4, 6);
});
