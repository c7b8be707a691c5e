import type { Body } from "./bodies";
import { zonePieces } from "./bodies";
import type { Modeller } from "./modeller";
import { move } from "./placing";
import { placePart } from "./placePart";
import type { Scene } from "./scene";
import type { Stage } from "./stage";
import type { Thing } from "./toolBars";

/** Volume (mm3) that a body, built and placed anew as a solid, shares with a shaved thing at a moment of the stroke. */
export function solidsMeet(modeller: Modeller, { part, hit, die }: Scene, stage: Stage, thing: Thing, body: Body, moment: number): number {
  const angle = stage.motion.angles[moment] ?? 0;
  const placed = placePart(part, hit, die, angle);
  if (!placed) return 0;
  const bar = modeller.bar(thing.shape.shavedRings, thing.lift + (thing.onRam ? placed.tip : 0), thing.from, thing.to);
  const face = part.faces[body.face ?? -1];
  const bend = part.bends[body.bend ?? -1];
  const frame = placed.faces[face ? body.face ?? 0 : bend?.parent ?? 0] ?? [];
  const solid = face
    ? modeller.plate(face.outline, face.holes, part.thickness, frame)
    : modeller.hulls(bend ? zonePieces(bend, part.thickness, (hit.formed >> (body.bend ?? 0)) & 1 ? bend.angle : 0).map((points) => points.map((p) => move(frame, p))) : []);
  const volume = modeller.shared(solid, bar);
  bar.delete();
  solid.delete();
  return volume;
}
