import type { Mm } from "../core/units";
import { convexPieces } from "../geometry/convexPieces";
import type { Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import type { ClearanceHit } from "./clearance";
import { clearanceHit } from "./clearanceHit";
import type { Shape } from "./convexPiece";
import { createObstacles } from "./createObstacles";
import { facePaths, type FacePath } from "./facePath";
import type { Hit } from "./hit";
import type { FaceMeeting } from "./hitTable";
import { meetStroke } from "./meetStroke";
import type { Obstacle } from "./obstacle";
import { platesOf, type Plates } from "./plates";
import { prismsOf } from "./prismsOf";
import { sweepShape } from "./sweepShape";

/** The second stroke of a hem: the part lies level in front, its fold against the end of the slot, while the die closes on it. */
export interface Flattening {
  /** What of the part meets a tool that stands on the bed, from when it is put in until it is drawn out. */
  meets(hit: Hit, punch: Punch, die: Die, tool: Tool): readonly ClearanceHit[];
  /** The same for ram and bed, and for a fold that does not go into the open slot. */
  blocked(hit: Hit, punch: Punch, die: Die): readonly ClearanceHit[];
}

/** mm. Farther than any part reaches. */
const AWAY = 1e4;

/**
 * The part in the slot of a two-stage hem die. Only what is in front of the fold can be in the way: the leg behind it is what the slot is
 * for. Put in and drawn out straight and level with the ram up; in the slot the ram comes down as far as the V is deep. Its plane may touch
 * the die on either side of the V, as the front half in a stroke; the margin holds for everything else.
 */
export function createFlattening(part: PartModel, machine: Machine, margin: Mm): Flattening {
  const obstacles = createObstacles(machine, margin);
  const pieces = part.faces.map((face) => convexPieces(face.outline, face.holes));
  const plates = new Map<string, Plates>();
  const known = new Map<string, readonly FaceMeeting[]>();
  const platesAt = (hit: Hit, path: FacePath, state: number): Plates => {
    const key = `${hit.bends.join()}/${path.face}/${state}`;
    const found = plates.get(key) ?? platesOf(prismsOf(part, path, state, pieces[path.face] ?? []));
    plates.set(key, found);
    return found;
  };
  const met = (hit: Hit, die: Die, obstacle: Obstacle, punch: Punch): readonly FaceMeeting[] => {
    const bend = part.bends[hit.bends[0] ?? -1];
    const paths = facePaths(part, hit).filter(({ inFront }) => inFront);
    const mask = paths.reduce((bits, path) => bits | path.mask, 0);
    const key = [hit.bends.join(), hit.formed & mask, obstacle.kind, obstacle.tool, obstacle.lift, punch.id, die.id].join("/");
    const answer = known.get(key);
    if (answer || bend === undefined) return answer ?? [];
    const shape = passed(part, bend, die, obstacle, Math.max(0, Math.min(machine.stroke, machine.daylight - punch.height - die.height)), margin);
    const found = paths.flatMap((path): readonly FaceMeeting[] => {
      const state = hit.formed & path.mask;
      const meeting = meetStroke({
        bend, thickness: part.thickness, plates: platesAt(hit, path, state), inFront: true, shape, lift: () => 0, from: 0, to: 0, steps: 0, margin, count: () => undefined,
      });
      return meeting.intervals.length > 0 ? [{ path, state, meeting: { ...meeting, strokeAngle: bend.angle } }] : [];
    });
    known.set(key, found);
    return found;
  };
  return {
    meets: (hit, punch, die, tool) => {
      const obstacle = obstacles.ofTool(tool, punch, die);
      return met(hit, die, obstacle, punch).map((meeting) => clearanceHit(obstacle.kind, obstacle.tool, meeting));
    },
    blocked: (hit, punch, die) => [obstacles.ram(punch), obstacles.bed(die)]
      .flatMap((obstacle) => met(hit, die, obstacle, punch).map((meeting) => clearanceHit(obstacle.kind, null, meeting))),
  };
}

/** What an obstacle goes through, seen from where the punch's tip would be if the part lay on the die: there and back, and up with the ram. */
function passed(part: PartModel, bend: Bend, die: Die, obstacle: Obstacle, opening: number, margin: Mm): Shape {
  const slot = die.flattening;
  if (slot === undefined) return [];
  const fold = bend.insideRadius + part.thickness;
  const depth = Math.min(slot.floor, die.vOpening / 2 / Math.tan(die.vAngle / 2));
  const x = fold - slot.back;
  const die0 = -part.thickness + slot.floor;
  const onBed = (up: number): Vec2 => [x, die0 + obstacle.lift + up];
  return obstacle.on === "bed"
    ? sweepShape(obstacle.tool === die.id ? obstacle.shape.map((piece) => ({ ...piece, role: "left" as const })) : obstacle.shape, onBed(0), [AWAY, 0], margin)
    : [...sweepShape(obstacle.shape, onBed(-depth), [0, depth + opening], margin), ...sweepShape(obstacle.shape, onBed(opening), [AWAY, 0], margin)];
}

