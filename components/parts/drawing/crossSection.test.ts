import { describe, expect, it } from "vitest";
import type { PartModel } from "@/bending/part/partModel";
import { builtInMaterials } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { crossSection } from "./crossSection";

function model(legs: readonly number[], bends: readonly { angle: number; direction: "up" | "down" }[]): PartModel {
  const read = readPartDocument({ format: "part/1", name: "x", units: "mm", material: "S235", thickness: 2, insideRadius: 2, rule: "din6935", profile: { width: 100, legs, bends } });
  if (!read.ok) throw new Error(read.error.map((problem) => problem.message).join());
  const built = buildPart(read.value, { materials: (id) => builtInMaterials.find((material) => material.id === id) });
  if (!built.ok) throw new Error(built.error.map((problem) => problem.message).join());
  return built.value;
}

describe("crossSection", () => {
  it("measures outside what was typed outside: a channel", () => {
    const section = crossSection(model([40, 80, 30], [{ angle: 90, direction: "up" }, { angle: 90, direction: "up" }]));
    const [a, b, c] = section?.legs ?? [];
    expect(Math.hypot((b?.to[0] ?? 0) - (b?.from[0] ?? 0), (b?.to[1] ?? 0) - (b?.from[1] ?? 0))).toBeCloseTo(80 - 8, 6);
    expect(b?.along[0]).toBeCloseTo(1, 9);
    expect((a?.from[1] ?? 0) - (b?.from[1] ?? 0)).toBeCloseTo(39, 6);
    expect((c?.to[1] ?? 0) - (b?.to[1] ?? 0)).toBeCloseTo(29, 6);
    expect((c?.to[0] ?? 0) - (a?.to[0] ?? 0)).toBeCloseTo(80 - 2, 6);
  });

  it("keeps the first and last leg of an offset parallel", () => {
    const legs = crossSection(model([30, 60, 30], [{ angle: 45, direction: "up" }, { angle: 45, direction: "down" }]))?.legs;
    expect(legs?.[0]?.along[0]).toBeCloseTo(legs?.[2]?.along[0] ?? 9, 9);
    expect(legs?.[0]?.along[1]).toBeCloseTo(legs?.[2]?.along[1] ?? 9, 9);
  });
});
