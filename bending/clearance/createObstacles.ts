import type { Mm } from "../core/units";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import type { Shape } from "./convexPiece";
import { dieShape } from "./dieShape";
import type { Obstacle } from "./obstacle";
import { punchShape } from "./punchShape";
import { shapeOf } from "./shapeOf";

export interface Obstacles {
  ofTool(tool: Tool, punch: Punch, die: Die): Obstacle;
  ram(punch: Punch): Obstacle;
  bed(die: Die): Obstacle;
}

/** Tools, ram and bed as obstacles. All punches hang at one seat and all dies stand on one, so a higher neighbour reaches farther in. */
export function createObstacles(machine: Machine, margin: Mm): Obstacles {
  const shapes = new Map<Tool, Shape>();
  const ramShape = shapeOf(machine.ramProfile, margin, null);
  const bedShape = shapeOf(machine.bedProfile, margin, null);
  const known = new Map<Tool | "ram" | "bed", Map<number, Obstacle>>();
  const once = (what: Tool | "ram" | "bed", lift: number, make: () => Omit<Obstacle, "lift">): Obstacle => {
    const placed = known.get(what) ?? new Map<number, Obstacle>();
    known.set(what, placed);
    const found = placed.get(lift) ?? { ...make(), lift };
    placed.set(lift, found);
    return found;
  };
  const shape = (tool: Tool): Shape => {
    const found = shapes.get(tool) ?? (tool.kind === "punch" ? punchShape(tool, margin) : dieShape(tool, margin));
    shapes.set(tool, found);
    return found;
  };
  return {
    ofTool: (tool, punch, die) =>
      once(tool, tool.kind === "punch" ? punch.height - tool.height : tool.height - die.height,
        () => ({ kind: tool.kind, tool: tool.id, shape: shape(tool), on: tool.kind === "punch" ? "ram" : "bed" })),
    ram: (punch) => once("ram", punch.height, () => ({ kind: "ram", tool: null, shape: ramShape, on: "ram" })),
    bed: (die) => once("bed", -die.height, () => ({ kind: "bed", tool: null, shape: bedShape, on: "bed" })),
  };
}
