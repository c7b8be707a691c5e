import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { bendFrame } from "../part/bendFrame";
import type { Bend, PartModel } from "../part/partModel";
import { bentBend } from "./bentBend";
import { difference } from "./difference";

/**
 * How a finished bend's errors move the sheet beyond it: derivatives of its frame, from the child's sheet to the parent's. Applied to
 * a point as frames are they give millimetres a millimetre that the line lies off, and millimetres a radian that the angle is over.
 */
export interface BendMotion {
  readonly shift: Frame;
  readonly turn: Frame;
}

export function bendMotion(part: PartModel, bend: Bend): BendMotion {
  const slope = (frame: (by: number) => Frame, by: number): Frame => {
    const [over, under] = [frame(by), frame(-by)];
    const axis = (of: keyof Frame) => over[of].map((value, i) => (value - under[of][i as 0]) / (2 * by)) as unknown as Vec3;
    return { x: axis("x"), y: axis("y"), z: axis("z"), o: axis("o") };
  };
  const bent = (shift: number, turn: number): Frame => {
    const one = bentBend(bend, shift, turn);
    return bendFrame(part, one, one.angle);
  };
  return { shift: slope((by) => bent(by, 0), difference.shift), turn: slope((by) => bent(0, by), difference.turn) };
}
