import { MEANT_CONTACT_MM } from "../core/tolerance";
import { convexOverlap } from "../geometry/convexOverlap";
import { convexPieces } from "../geometry/convexPieces";
import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import type { Vec2 } from "../geometry/vec2";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";

/** A cross-section in convex pieces, and the box round it. */
interface Body { readonly pieces: readonly (readonly Vec2[])[]; readonly bounds: Bounds2 }

/** Heights of what stands on the bed and hangs on the ram when the punch touches the flat sheet, over the die's top plane. */
export interface ToolHeights {
  /** The seat of the punches, and that of the dies. */
  readonly punchSeat: number;
  readonly dieSeat: number;
}

/** The seats when this pair is in use. */
export const toolHeights = (thickness: number, punch: Punch, die: Die): ToolHeights => ({ punchSeat: thickness + punch.height, dieSeat: -die.height });

export interface FingerAgainstTools {
  /** Does a finger with its stop at (x, r) stand in the tool? */
  readonly tool: (x: number, r: number, tool: Tool, heights: ToolHeights) => boolean;
  /** In the punch, the die, the ram or the bed, when these two are in use? */
  readonly pair: (x: number, r: number, thickness: number, punch: Punch, die: Die) => boolean;
}

export function createFingerAgainstTools(machine: Machine): FingerAgainstTools {
  const finger = bodyOf(machine.gauge.fingerProfile);
  const [ram, bed] = [bodyOf(machine.ramProfile), bodyOf(machine.bedProfile)];
  const tools = new Map<Tool, Body>();
  const ofTool = (tool: Tool): Body => {
    const found = tools.get(tool) ?? bodyOf(tool.profile);
    tools.set(tool, found);
    return found;
  };
  const meets = (x: number, r: number, body: Body, lift: number): boolean => {
    const [one, other] = [finger.bounds, body.bounds];
    if (one.min[0] + x > other.max[0] || one.max[0] + x < other.min[0] || one.min[1] + r > other.max[1] + lift || one.max[1] + r < other.min[1] + lift) return false;
    const parts = finger.pieces.map((piece) => piece.map((p): Vec2 => [p[0] + x, p[1] + r - lift]));
    return body.pieces.some((piece) => parts.some((part) => convexOverlap(part, piece) > MEANT_CONTACT_MM));
  };
  const inTool = (x: number, r: number, tool: Tool, { punchSeat, dieSeat }: ToolHeights) =>
    meets(x, r, ofTool(tool), tool.kind === "punch" ? punchSeat - tool.height : dieSeat + tool.height);
  return {
    tool: inTool,
    pair: (x, r, thickness, punch, die) => {
      const heights = toolHeights(thickness, punch, die);
      return inTool(x, r, die, heights) || inTool(x, r, punch, heights) || meets(x, r, ram, heights.punchSeat) || meets(x, r, bed, heights.dieSeat);
    },
  };
}

function bodyOf(profile: readonly Vec2[]): Body {
  return { pieces: convexPieces(profile), bounds: polygonBounds(profile) };
}
