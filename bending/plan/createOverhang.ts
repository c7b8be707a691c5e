import { facePaths, type FacePath } from "../clearance/facePath";
import { SAME_POINT_MM } from "../core/tolerance";
import type { FlatPoint } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";
import type { Situation } from "./situation";

/** Radians. Sheet in front that has turned no farther than square does not come back over the bend line. */
const SQUARE = Math.PI / 2 + 1e-6;

/**
 * Answers whether the half in front may reach back over the bend line, where it could stand in a finger's way: false only where it surely does
 * not. For that no face may lie over the line in the flat, and each must be too short to come back so far or have turned by no more than a right angle on its way.
 */
export function createOverhang({ part, moves }: Pick<Situation, "part" | "moves">): (move: number, formed: number) => boolean {
  const known = moves.map(({ bends, front }) => {
    const paths = facePaths(part, { bends, front, formed: 0 }).filter(({ inFront }) => inFront);
    const flat = paths.some((path) => Math.min(...(part.faces[path.face]?.outline ?? []).map(fromLine(path))) < -SAME_POINT_MM);
    const long = paths.filter((path) => nearest(part, path) < 0);
    return { flat, paths: long.map((path) => path.bends.map((index) => ({ bit: 1 << index, angle: part.bends[index]?.angle ?? 0 }))) };
  });
  return (move, formed) => {
    const one = known[move];
    return one === undefined || one.flat || one.paths.some((path) => path.reduce((sum, { bit, angle }) => (formed & bit ? sum + angle : sum), 0) > SQUARE);
  };
}

/** How far a point of the flat lies from the line of the stroke, on the half's own side. */
const fromLine = ({ line: { bend, across }, wingIsParent }: FacePath) => ([x, y]: FlatPoint): number =>
  (across[0] * (x - bend.line[0][0]) + across[1] * (y - bend.line[0][1])) * (wingIsParent ? -1 : 1);

/**
 * No point of the face comes nearer to the line, or farther over it, than this in any state. A face that turns about an axis square to the line keeps its distance; any other comes
 * back by as much as it is high over its own bend at the most, and what hangs on it goes on from there.
 */
function nearest(part: PartModel, path: FacePath): number {
  const off = fromLine(path);
  let at = path.wingIsParent ? path.line.bend.parent : path.line.bend.child;
  let least = Math.min(...(part.faces[at]?.outline ?? []).map(off));
  let keeps = true;
  for (const index of path.bends) {
    const bend = part.bends[index];
    if (bend === undefined) continue;
    at = bend.parent === at ? bend.child : bend.parent;
    const outline = part.faces[at]?.outline ?? [];
    const { along, outward } = bendDirections(bend);
    const foot = keeps ? Math.min(...bend.line.map(off)) : least;
    keeps &&= Math.abs(along[0] * path.line.along[0] + along[1] * path.line.along[1]) < 1e-9;
    const [start] = bend.line;
    const high = Math.max(...outline.map(([x, y]) => Math.abs(outward[0] * (x - start[0]) + outward[1] * (y - start[1]))));
    least = keeps ? Math.min(...outline.map(off)) : foot - high;
  }
  return least;
}
