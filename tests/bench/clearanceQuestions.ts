import { clipPrism, type Clipped } from "@/bending/clearance/clipPrism";
import { createBendShapes } from "@/bending/clearance/createBendShapes";
import { createHalf } from "@/bending/clearance/createHalf";
import { facesOf } from "@/bending/clearance/facesOf";
import type { Hit } from "@/bending/clearance/hit";
import { machineFrames } from "@/bending/clearance/machineFrames";
import { posePrism } from "@/bending/clearance/posePrism";
import { punchShape } from "@/bending/clearance/punchShape";
import { strokePlacement } from "@/bending/clearance/strokePlacement";
import { POSE_NUMBERS } from "@/bending/clearance/strokeMotion";
import { writePose } from "@/bending/clearance/writePose";
import { createSolids } from "@/bending/clearance/trial/solids";
import { createDice, randomPart } from "@/bending/clearance/trial/trialParts";
import { straightPunch, trialMachine, vDie } from "@/bending/clearance/trial/trialTools";
import { convexPieces } from "@/bending/geometry/convexPieces";
import type { PartModel } from "@/bending/part/partModel";

interface Question { readonly part: PartModel; readonly hit: Hit }

const punch = straightPunch("P88");
const die = vDie("V16");
const margin = trialMachine.settings.clearance;

/** Random parts at the end of a random stroke: which faces come within the margin of the punch, and over which part of the bed? */
export async function clearanceQuestions(count: number) {
  const questions = Array.from({ length: count }, (_, seed): Question => {
    const dice = createDice(seed + 1);
    const part = randomPart(dice);
    const bend = Math.floor(dice(0, part.bends.length - 1e-9));
    return { part, hit: { bends: [bend], front: part.bends[bend]?.parent ?? 0, formed: Math.floor(dice(0, 2 ** part.bends.length)) & ~(1 << bend) } };
  });
  const shape = punchShape(punch, margin);
  const solids = await createSolids();
  return { faces: questions.reduce((sum, { part }) => sum + part.faces.length, 0), clipped: () => sum(questions, (one) => clippedFaces(one)), solid: () => sum(questions, solidFaces) };

  function clippedFaces({ part, hit }: Question): number {
    const out: Clipped = { separation: 0, from: 0, to: 0 };
    const bend = part.bends[hit.bends[0] ?? 0];
    if (!bend) return 0;
    const pose = new Float64Array(POSE_NUMBERS);
    writePose(bend, part.thickness, null, bend.angle / 2, pose, 0);
    const pieces = part.faces.map((face) => convexPieces(face.outline, face.holes));
    const shapes = createBendShapes(part);
    return [bend.parent, bend.child].flatMap((front) => facesOf(createHalf(part, hit.bends, front, pieces, shapes).at(hit.formed)).filter((face) => face.plates().all.some((prism) => {
      const placed = new Float64Array(prism.points.length);
      posePrism(prism.points, pose, 0, front === bend.child, placed);
      return prism.of === "face" && shape.some((piece) => {
        clipPrism(placed, prism.count, piece.withMargin, 0, out);
        return out.separation <= 0 && out.from <= out.to;
      });
    }))).length;
  }

  function solidFaces({ part, hit }: Question): number {
    const bend = part.bends[hit.bends[0] ?? 0];
    if (!bend) return 0;
    const frames = machineFrames(part, hit, bend.angle, punch, die);
    const bar = solids.bar(punch.profile, margin, strokePlacement(bend, part.thickness, die, bend.angle).tipHeight);
    const met = part.faces.filter((face, i) => {
      const frame = frames[i];
      if (!frame) return false;
      const plate = solids.plate(face.outline, face.holes, part.thickness, frame);
      const shared = solids.shared(plate, bar);
      plate.delete();
      return shared !== null;
    }).length;
    bar.delete();
    return met;
  }
}

const sum = (questions: readonly Question[], ask: (question: Question) => number) => questions.reduce((total, question) => total + ask(question), 0);
