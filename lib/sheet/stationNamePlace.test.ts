import { expect, it } from "vitest";
import type { BedMap } from "./bedMap";
import { stationNamePlace } from "./stationNamePlace";

const station = (id: string, from: number, to: number): BedMap["stations"][number] =>
  ({ id, from, to, fromText: "", toText: "", punch: "PR88-R0.8-H150", die: "V8-30-H60", pieces: [] });

it("keeps the names of neighbours apart", () => {
  const near = [station("A", 79, 189), station("B", -189, -21)];
  expect(stationNamePlace(near, "B", 45)).toEqual({ x: -21, anchor: "end" });
  expect(stationNamePlace(near, "A", 45)).toEqual({ x: 79, anchor: "start" });
});

it("sets a name over the middle where there is room", () => {
  const far = [station("A", 400, 600), station("B", -600, -400)];
  expect(stationNamePlace(far, "A", 45)).toEqual({ x: 500, anchor: "middle" });
  expect(stationNamePlace([station("A", -100, 100)], "A", 45)).toEqual({ x: 0, anchor: "middle" });
});
