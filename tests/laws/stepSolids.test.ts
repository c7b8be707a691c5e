import type { TopoDS_Shape } from "replicad-opencascadejs";
import { beforeAll, describe, expect, test } from "vitest";
import { importedDocument } from "@/bending/exchange/step/importedDocument";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import { toPartDocument } from "@/bending/exchange/step/toPartDocument";
import { identityFrame } from "@/bending/geometry/identityFrame";
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
