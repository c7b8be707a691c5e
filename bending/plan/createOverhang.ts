import { facePaths } from "../clearance/facePath";
import { SAME_POINT_MM } from "../core/tolerance";
import type { Situation } from "./situation";

/** Radians. Sheet in front that has turned no farther than square does not come back over the bend line. */
const SQUARE = Math.PI / 2 + 1e-6;

/**
 * Answers whether the half in front may reach back over the bend line, where it could stand in a finger's way: false only where it surely does
 * not, because nothing of it lies over the line in the flat and no face of it has turned by more than a right angle on its way.
 */
export function createOverhang({ part, moves }: Pick<Situation, "part" | "moves">): (move: number, formed: number) => boolean {
  const known = moves.map(({ bends, front }) => {
    const paths = facePaths(part, { bends, front, formed: 0 }).filter(({ inFront }) => inFront);
    const flat = paths.some(({ face, line: { bend, across }, wingIsParent }) => (part.faces[face]?.outline ?? []).some(([x, y]) => {
      const beyond = across[0] * (x - bend.line[0][0]) + across[1] * (y - bend.line[0][1]);
      return (wingIsParent ? beyond : -beyond) > SAME_POINT_MM;
    }));
    return { flat, paths: paths.map((path) => path.bends.map((index) => ({ bit: 1 << index, angle: part.bends[index]?.angle ?? 0 }))) };
  });
  return (move, formed) => {
    const one = known[move];
    return one === undefined || one.flat || one.paths.some((path) => path.reduce((sum, { bit, angle }) => (formed & bit ? sum + angle : sum), 0) > SQUARE);
  };
}
