import type { Mm } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import { alikeBothWays } from "./alikeBothWays";
import type { Shape } from "./convexPiece";
import { dieShape } from "./dieShape";
import { mirrorShape } from "./mirrorShape";
import type { Obstacle } from "./obstacle";
import { placedShape } from "./placedShape";
import { punchShape } from "./punchShape";
import { shapeOf } from "./shapeOf";

export interface Obstacles {
  ofTool(tool: Tool, punch: Punch, die: Die): Obstacle;
  ram(punch: Punch): Obstacle;
  bed(die: Die): Obstacle;
}

type Body = Pick<Obstacle, "kind" | "tool" | "shape" | "turned" | "on">;
interface Kept { readonly body: Body; readonly placed: Map<number, Obstacle> }

/** Tools, ram and bed as obstacles. All punches hang at one seat and all dies stand on one, so a higher neighbour reaches farther in. */
export function createObstacles(machine: Machine, margin: Mm): Obstacles {
  const ram = keep("ram", null, machine.ramProfile, shapeOf(machine.ramProfile, margin, null), "ram");
  const bed = keep("bed", null, machine.bedProfile, shapeOf(machine.bedProfile, margin, null), "bed");
  const tools = new Map<Tool, Kept>();
  const ofTool = (tool: Tool): Kept => {
    const known = tools.get(tool);
    if (known) return known;
    const shape = tool.kind === "punch" ? punchShape(tool, margin) : dieShape(tool, margin);
    const made = keep(tool.kind, tool.id, tool.profile, shape, tool.kind === "punch" ? "ram" : "bed");
    tools.set(tool, made);
    return made;
  };
  return {
    ofTool: (tool, punch, die) => at(ofTool(tool), tool.kind === "punch" ? punch.height - tool.height : tool.height - die.height),
    ram: (punch) => at(ram, punch.height),
    bed: (die) => at(bed, -die.height),
  };
}

function keep(kind: Body["kind"], tool: string | null, profile: readonly ProfilePoint[], pieces: Shape, on: Body["on"]): Kept {
  const shape = placedShape(pieces);
  const turned = alikeBothWays(profile) ? shape : placedShape(mirrorShape(pieces));
  return { body: { kind, tool, shape, turned, on }, placed: new Map() };
}

function at({ body, placed }: Kept, lift: number): Obstacle {
  const found = placed.get(lift) ?? { ...body, lift };
  placed.set(lift, found);
  return found;
}
