import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { GrownTree } from "./growTree";
import type { ReadBend, ReadPlate } from "./readPlates";

/** Sides of a plate that differ by more than this part are worth a word. */
const UNEVEN = 1e-4;

/** What was taken a little differently from how the solid has it. */
export function recognitionNotes(tree: GrownTree, plates: readonly ReadPlate[], bends: readonly ReadBend[]): readonly string[] {
  const faces = (numbers: readonly number[]) => `${numbers.length === 1 ? "face" : "faces"} ${numbers.map((face) => face + 1).join(" and ")}`;
  return [
    ...tree.bends.flatMap(({ joint, unequal, length }) => [
      ...(unequal > SOLID_MATCH_MM ? [`The bend at ${faces(joint.faces)} does not end square: it is taken over the ${mm(length)} that both its sides have, ${mm(unequal)} of its longer side stay unbent.`] : []),
      ...(joint.insideRadius === 0 ? [joint.overrun > 0
        ? `The bend between ${faces(joint.inner.map(({ face }) => face))} is sharp inside and outside: taken with inside radius 0 and a round outside. Give it the radius that will be bent.`
        : `The bend between ${faces(joint.inner.map(({ face }) => face))} is sharp inside: taken with inside radius 0. Give it the radius that will be bent.`] : []),
    ]),
    ...bends.flatMap(({ bend, cutOuts: { windows, closed, blind, widened, leaning, face, crooked } }) => {
      const at = `the bend at ${faces(bend.faces)}`;
      const wider = `${widened === 1 ? "A hole" : `${widened} holes`} in ${at} ${widened === 1 ? "is" : "are"} wider on one side: taken at the narrower.`;
      return [
        ...(windows.length > 0 ? [`${windows.length === 1 ? "A cut-out reaches" : `${windows.length} cut-outs reach`} into ${at}: drawn in the flat by the allowance that the bend has now.`] : []),
        ...(leaning > 0 && face !== null ? [`Rims of cut-outs in ${at} are not square to the sheet: taken as they are on face ${face + 1}.`] : []),
        ...(widened > 0 ? [wider] : []),
        ...(closed > 0 ? [`A cut-out reaches into ${at} from one side only: it is left closed.`] : []),
        ...(blind > 0 ? [`A cut-out in ${at} is on one of its two sides only: it is left closed.`] : []),
        ...(crooked > 0 ? [`${crooked === 1 ? "An end" : `${crooked} ends`} of ${at} ${crooked === 1 ? "is" : "are"} not straight, such as notched: taken straight.`] : []),
      ];
    }),
    ...tree.closing.map((joint) => `The bend at ${faces(joint.faces.length > 0 ? joint.faces : joint.inner.map(({ face }) => face))} joins plates that are joined already: a ring, or a bend cut in two. It is left open.`),
    ...plates.flatMap(({ plate, widenedHoles, uneven, chords }) => [
      ...(widenedHoles > 0 ? [`${widenedHoles === 1 ? "A hole" : `${widenedHoles} holes`} in ${faces(plate.faces)} ${widenedHoles === 1 ? "is" : "are"} wider on one side: taken at the narrower.`] : []),
      ...(uneven > UNEVEN ? [`The rims of ${faces(plate.faces)} are not square to the sheet: the outline is that of face ${plate.faces[0] + 1}.`] : []),
      ...(chords ? [`Curves of ${faces(plate.faces)} that are no arcs are taken as short straight edges.`] : []),
    ]),
  ];
}

const mm = (value: number) => `${Number(value.toFixed(3))} mm`;
