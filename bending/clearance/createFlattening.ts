import { rad, type Mm } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import type { Die, Punch, Tool } from "../tooling/tool";
import { AWAY_MM } from "./accessMotion";
import { askFace } from "./askHalf";
import { atRest } from "./atRest";
import type { ClearanceHit } from "./clearance";
import { clearanceHit } from "./clearanceHit";
import type { Shape } from "./convexPiece";
import { createHitPlaces } from "./createHitPlaces";
import { createKeys } from "./createKeys";
import { createObstacles } from "./createObstacles";
import { facesOf } from "./facesOf";
import type { Half } from "./half";
import type { Hit } from "./hit";
import { mirrorShape } from "./mirrorShape";
import type { Obstacle } from "./obstacle";
import { placedShape } from "./placedShape";
import type { Question } from "./question";
import { sweepShape } from "./sweepShape";

/** The second stroke of a hem: the part lies level in front, its fold against the end of the slot, while the die closes on it. */
export interface Flattening {
  /** What of the part meets a tool that stands on the bed, from when it is put in until it is drawn out. */
  meets(hit: Hit, punch: Punch, die: Die, tool: Tool): readonly ClearanceHit[];
  /** The same for ram and bed, and for a fold that does not go into the open slot. */
  blocked(hit: Hit, punch: Punch, die: Die): readonly ClearanceHit[];
}

/**
 * The part in the slot of a two-stage hem die. Only what is in front of the fold can be in the way: the leg behind it is what the slot is
 * for. Put in and drawn out straight and level with the ram up; in the slot the ram comes down as far as the V is deep. Its plane may touch
 * the die on either side of the V, as the front half in a stroke; the margin holds for everything else.
 */
export function createFlattening(part: PartModel, machine: Machine, margin: Mm): Flattening {
  const obstacles = createObstacles(machine, margin);
  const counts = { clips: 0, entries: 0 };
  const placeOf = createHitPlaces(part, margin, counts);
  const keys = createKeys();
  const questions = new WeakMap<object, Question>();
  const questionOf = (half: Half, punch: Punch, die: Die, obstacle: Obstacle): Question => {
    const key = keys(half, punch, die, obstacle);
    const known = questions.get(key);
    if (known) return known;
    const { bend, thickness } = half;
    const shape = placedShape(mirrorShape(passed(part, bend, die, obstacle, Math.max(0, Math.min(machine.stroke, machine.daylight - punch.height - die.height)), margin)));
    const made: Question = { index: half.nextQuestion(), shape, everywhere: null, lift: 0, onBed: false, motion: atRest(bend, thickness, rad(0)), margin, counts };
    questions.set(key, made);
    return made;
  };
  const met = (hit: Hit, die: Die, obstacle: Obstacle, punch: Punch): readonly ClearanceHit[] => {
    const { front } = placeOf(hit);
    const question = questionOf(front, punch, die, obstacle);
    return facesOf(front.at(hit.formed)).flatMap((face): readonly ClearanceHit[] => {
      const meeting = askFace(question, face);
      return meeting.intervals.length > 0 ? [clearanceHit(obstacle.kind, obstacle.tool, face, { ...meeting, strokeAngle: front.bend.angle }, true)] : [];
    });
  };
  return {
    meets: (hit, punch, die, tool) => met(hit, die, obstacles.ofTool(tool, punch, die), punch),
    blocked: (hit, punch, die) => [obstacles.ram(punch), obstacles.bed(die)].flatMap((obstacle) => met(hit, die, obstacle, punch)),
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
    ? sweepShape(obstacle.tool === die.id ? obstacle.shape.pieces.map((piece) => ({ ...piece, role: "left" as const })) : obstacle.shape.pieces, onBed(0), [AWAY_MM, 0], margin)
    : [...sweepShape(obstacle.shape.pieces, onBed(-depth), [0, depth + opening], margin), ...sweepShape(obstacle.shape.pieces, onBed(opening), [AWAY_MM, 0], margin)];
}
