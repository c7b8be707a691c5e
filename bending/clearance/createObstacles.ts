import type { Mm } from "../core/units";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import { dieShape } from "./dieShape";
import type { Obstacle } from "./obstacle";
import { punchShape } from "./punchShape";
import { shapeOf } from "./shapeOf";

export interface Obstacles {
  /** A number for a tool, the same for the same object. */
  number(tool: Tool): number;
  ofTool(tool: Tool, punch: Punch, die: Die): Obstacle;
  ram(punch: Punch): Obstacle;
  bed(die: Die): Obstacle;
}

/** Tools, ram and bed as obstacles. All punches hang at one seat and all dies stand on one, so a higher neighbour reaches farther in. */
export function createObstacles(machine: Machine, margin: Mm): Obstacles {
  const known = new Map<Tool, { readonly number: number; readonly shape: Obstacle["shape"] }>();
  const ramShape = shapeOf(machine.ramProfile, margin, null);
  const bedShape = shapeOf(machine.bedProfile, margin, null);
  const look = (tool: Tool) => {
    const found = known.get(tool) ?? { number: known.size, shape: tool.kind === "punch" ? punchShape(tool, margin) : dieShape(tool, margin) };
    known.set(tool, found);
    return found;
  };
  return {
    number: (tool) => look(tool).number,
    ofTool: (tool, punch, die) => {
      const { number, shape } = look(tool);
      const lift = tool.kind === "punch" ? punch.height - tool.height : tool.height - die.height;
      return { kind: tool.kind, tool: tool.id, key: `${number}/${lift}`, shape, on: tool.kind === "punch" ? "ram" : "bed", lift };
    },
    ram: (punch) => ({ kind: "ram", tool: null, key: `ram/${punch.height}`, shape: ramShape, on: "ram", lift: punch.height }),
    bed: (die) => ({ kind: "bed", tool: null, key: `bed/${die.height}`, shape: bedShape, on: "bed", lift: -die.height }),
  };
}
