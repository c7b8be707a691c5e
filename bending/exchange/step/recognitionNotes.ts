import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { GrownTree } from "./growTree";
import type { ReadPlate } from "./readPlates";
import type { RecognisedBend } from "./recognisedPart";

/** Sides of a plate that differ by more than this part are worth a word. */
const UNEVEN = 1e-4;

/** What was taken a little differently from how the solid has it. */
export function recognitionNotes(tree: GrownTree, plates: readonly ReadPlate[], bends: readonly RecognisedBend[]): readonly string[] {
  const cutOuts = tree.bends.map((bend) => Math.max(...[bend.parent, bend.child].map((plate) => plates[plate]?.cutOuts.get(bend)?.length ?? 0)));
  const faces = (numbers: readonly number[]) => `${numbers.length === 1 ? "face" : "faces"} ${numbers.map((face) => face + 1).join(" and ")}`;
  return [
    ...tree.bends.flatMap(({ joint, unequal, length }) => [
      ...(unequal > SOLID_MATCH_MM ? [`The bend at ${faces(joint.faces)} does not end square: it is taken over the ${mm(length)} that both its sides have, ${mm(unequal)} of its longer side stay unbent.`] : []),
      ...(joint.insideRadius === 0 ? [joint.overrun > 0
        ? `The bend between ${faces(joint.inner.map(({ face }) => face))} is sharp inside and outside: taken with inside radius 0 and a round outside. Give it the radius that will be bent.`
        : `The bend between ${faces(joint.inner.map(({ face }) => face))} is sharp inside: taken with inside radius 0. Give it the radius that will be bent.`] : []),
    ]),
    ...bends.flatMap(({ faces: numbers, windows }, i) => {
      const open = cutOuts[i] ?? 0;
      return [
        ...(windows.length > 0 ? [`${windows.length === 1 ? "A cut-out runs" : `${windows.length} cut-outs run`} across the bend at ${faces(numbers)}: drawn in the flat by the allowance that the bend has now.`] : []),
        ...(open > windows.length ? [`A cut-out reaches into the bend at ${faces(numbers)} from one side only: it is left closed.`] : []),
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
