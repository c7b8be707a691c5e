import { WebIO } from "@gltf-transform/core";
import validator from "gltf-validator";
import { describe, expect, test } from "vitest";
import { signedArea, type PartDocument, type PartModel } from "@/bending";
import { writeGlb } from "@/bending/exchange/glb/writeGlb";
import { mustBuild } from "./mustBuild";

const head = { format: "part/1", units: "mm", material: "S235", thickness: 2, insideRadius: 3 } as const;
const parts: readonly PartDocument[] = [
  { ...head, name: "Channel <1>", profile: { width: 120, legs: [40, 80, 40], bends: [{ angle: 90, direction: "up" }, { angle: 135, direction: "down" }] } },
  {
    ...head, name: "Tray", base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]], holes: [{ circle: [100, 60], diameter: 30 }] },
    flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }, { id: "back", on: "front", edge: 2, length: 20, angle: 60, direction: "up" }, { id: "side", on: "base", edge: 1, length: 25, angle: 90, direction: "down" }],
  },
  {
    ...head, name: "Flat with a hole across its bend",
    flat: { outline: [[0, 0], [120, 0], [120, 80], [0, 80]], holes: [{ circle: [40, 40], diameter: 20 }], bends: [{ id: "fold", line: [[40, 0], [40, 80]], angle: 90, direction: "up" }] },
  },
];

/** Volume of the folded part: faces by their area; a bend by Pappus's theorem, its section turned about the bend's axis. Holes across bends by hand. */
function volumeOf(part: PartModel): number {
  const t = part.thickness;
  const faces = part.faces.reduce((sum, face) => sum + signedArea(face.outline) - face.holes.reduce((holes, hole) => holes + Math.abs(signedArea(hole)), 0), 0);
  const bends = part.bends.reduce((sum, bend) => {
    const width = Math.hypot(bend.zone[3][0] - bend.zone[0][0], bend.zone[3][1] - bend.zone[0][1]);
    return sum + width * t * bend.angle * (bend.insideRadius + t / 2);
  }, 0);
  return faces * t + bends;
}

/** A hole of radius 10 with the bend line through its middle: what lies in the zone is stretched with it. */
function holeAcross(part: PartModel): number {
  const [bend] = part.bends;
  if (!bend || part.holesAcross.length === 0) return 0;
  const half = bend.allowance / 2;
  const within = 2 * (half * Math.sqrt(100 - half * half) + 100 * Math.asin(half / 10));
  const stretch = (bend.angle * (bend.insideRadius + part.thickness / 2)) / bend.allowance;
  return part.thickness * (Math.PI * 100 - within + within * stretch);
}

const subtract = (a: readonly number[], b: readonly number[]) => a.map((value, i) => value - (b[i] ?? 0));
const triple = (a: readonly number[], b: readonly number[], c: readonly number[]) => {
  const [ax = 0, ay = 0, az = 0] = a;
  const [bx = 0, by = 0, bz = 0] = b;
  const [cx = 0, cy = 0, cz = 0] = c;
  return ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx);
};

describe("the folded part as GLB", () => {
  test.each(parts.map((document) => [document.name, document] as const))("%s", async (name, document) => {
    const part = mustBuild(document);
    const file = writeGlb(part);
    const report = await validator.validateBytes(file);
    expect([report.issues.numErrors, report.issues.numWarnings]).toEqual([0, 0]);
    const root = (await new WebIO().readBinary(file)).getRoot();
    expect(root.listNodes().map((node) => node.getName()).sort()).toEqual([name, ...part.faces.map(({ id }) => id), ...part.bends.map(({ id }) => `${id}, bend`)].sort());
    expect(root.listMaterials().map((material) => material.getName())).toEqual(["S235", "S235, bend"]);
    let volume = 0;
    for (const mesh of root.listMeshes()) {
      let own = 0;
      for (const primitive of mesh.listPrimitives()) {
        const position = primitive.getAttribute("POSITION");
        const at = (i: number) => position?.getElement(i, []) ?? [0, 0, 0];
        const origin = at(0);
        for (let i = 0; i < (position?.getCount() ?? 0); i += 3) own += triple(subtract(at(i), origin), subtract(at(i + 1), origin), subtract(at(i + 2), origin)) / 6;
      }
      // Turned inside out it would be negative.
      expect(own).toBeGreaterThan(0);
      volume += own;
    }
    const whole = volumeOf(part) - holeAcross(part);
    expect(Math.abs(volume * 1e9 - whole) / whole).toBeLessThan(2e-3);
  });
});
