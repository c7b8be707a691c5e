import { expect, it } from "vitest";
import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { faceEdges } from "./faceEdges";

it("offers every edge that carries no flange, by the document's own count", () => {
  const read = readPartDocument({ format: "part/1", name: "x", units: "mm", material: "S235", thickness: 1, insideRadius: 1,
    base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]] },
    flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }, { id: "return", on: "front", edge: 2, length: 12, angle: 90, direction: "up" }] });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  const built = buildPart(read.value, { materials: materialById });
  if (!built.ok || read.value.base === undefined) throw new Error("cannot be built");
  const edges = faceEdges(built.value, read.value.base, 1).map(({ face, edge }) => `${face} ${edge}`);
  expect(edges.sort()).toEqual(["base 1", "base 2", "base 3", "front 1", "front 3", "return 1", "return 2", "return 3"]);
  const right = faceEdges(built.value, read.value.base, 1).find(({ face, edge }) => face === "base" && edge === 1);
  expect(right?.line.map(([x]) => Math.round(x))).toEqual([200, 200]);
});

it("tells the start side of a flange from its end side", () => {
  const read = readPartDocument({ format: "part/1", name: "x", units: "mm", material: "S235", thickness: 1, insideRadius: 1,
    base: { outline: [[0, 0], [200, 0], [200, 120], [0, 120]] }, flanges: [{ id: "front", on: "base", edge: 0, length: 30, angle: 90, direction: "up" }] });
  if (!read.ok) throw new Error(JSON.stringify(read.error));
  const built = buildPart(read.value, { materials: materialById });
  if (!built.ok || read.value.base === undefined) throw new Error("cannot be built");
  const at = (edge: number) => faceEdges(built.value, read.value.base ?? { outline: [] }, 1).find((one) => one.face === "front" && one.edge === edge)?.line[0][0];
  expect(at(3)).toBeCloseTo(0, 6);
  expect(at(1)).toBeCloseTo(200, 6);
});
