import { expect, test } from "vitest";
import { newBend } from "../draft/newRows";
import { fillDown } from "./fillDown";

const rows = [newBend("90"), { ...newBend("45", "down"), insideRadius: "2" }, newBend("30"), { ...newBend("180"), hem: "closed" as const }];

test("a column is copied to the rows below, the others and those above stay", () => {
  expect(fillDown(rows, "angle", 1).map(({ angle }) => angle)).toEqual(["90", "45", "45", "180"]);
  expect(fillDown(rows, "direction", 1).map(({ direction }) => direction)).toEqual(["up", "down", "down", "down"]);
  expect(fillDown(rows, "insideRadius", 1).map(({ insideRadius }) => insideRadius)).toEqual(["", "2", "2", ""]);
  expect(fillDown(rows, "angle", 9)).toBe(rows);
});
