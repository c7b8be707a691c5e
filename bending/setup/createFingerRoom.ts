import { clipPrism, type Clipped } from "../clearance/clipPrism";
import { facesOf } from "../clearance/facesOf";
import { halfPlanes } from "../clearance/halfPlanes";
import type { FaceState, Half, HalfState } from "../clearance/half";
import { MEANT_CONTACT_MM, SAME_POINT_MM } from "../core/tolerance";
import { convexPieces } from "../geometry/convexPieces";
import { freeIntervals } from "../geometry/freeIntervals";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { PartModel } from "../part/partModel";
import type { BackGauge } from "../tooling/machine";
import type { JoinedContact } from "./joinContacts";

/** Where the middle of a finger may stand on a contact; `half`: the one behind the die; `over`: faces of the half in front that reach over the bend line. */
export type FingerRoom = (half: Half, back: HalfState, contact: JoinedContact, over: readonly FaceState[]) => readonly Interval[];

/** A plate of the part in the machine's frame before the stroke: `count` corners on one side, then on the other. */
interface Plate { readonly count: number; readonly points: Float64Array; readonly round: boolean }

/**
 * On the contact by its whole width where that leaves room for two, by half its width at the least; and nothing within the
 * finger of what is behind the die, be it of the half in front. A plane face or the fold of a hem may touch the
 * finger's outside; another bend's round, a little large in plates, may not.
 */
export function createFingerRoom(part: PartModel, gauge: BackGauge): FingerRoom {
  const half = gauge.fingerWidth / 2;
  const fingers = convexPieces(gauge.fingerProfile).map((piece) => [halfPlanes(piece, () => -MEANT_CONTACT_MM), halfPlanes(piece, () => 0)] as const);
  const [xs, ys] = [gauge.fingerProfile.map((p) => p[0]), gauge.fingerProfile.map((p) => p[1])];
  const box: Box = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const plates = new Map<FaceState, readonly Plate[]>();
  const turned = new Map<FaceState, readonly Plate[]>();

  const platesOf = (face: FaceState, allowance: number): readonly Plate[] => {
    const known = plates.get(face);
    if (known) return known;
    const hem = part.bends[face.path.bends[face.path.bends.length - 1] ?? -1]?.hem ?? null;
    const made = face.plates().all.map(({ of, count, points }): Plate => ({
      count, round: of === "zone" && hem === null,
      points: points.map((value, i) => (i % 3 === 0 ? value + allowance / 2 : value)),
    }));
    plates.set(face, made);
    return made;
  };
  /** The same of a half in front, which stands turned by half a turn about the vertical. */
  const turnedOf = (face: FaceState, allowance: number): readonly Plate[] => {
    const made = turned.get(face) ?? platesOf(face, allowance).map((plate): Plate => ({ ...plate, points: plate.points.map((value, i) => (i % 3 === 1 ? value : -value)) }));
    turned.set(face, made);
    return made;
  };
  /**
   * z-extents of what is in a finger at (x, r). Along a slanted edge x grows by `slope` a millimetre of z: then everything is sheared until the edge runs
   * along the bed, and the finger, which reaches half its width to either side, is longer by what that shears it. So nothing is missed.
   */
  const meets = ({ bend, thickness, lines }: Half, back: HalfState, over: readonly FaceState[], x: number, r: number, slope: number): readonly Interval[] => {
    const grow = Math.abs(slope) * half;
    const met: Interval[] = [];
    let placed: readonly (readonly [Float64Array, Float64Array])[] | null = null;
    const look = ({ count, points, round }: Plate) => {
      placed ??= fingers.map(([within, whole]) => [moved(within, x, r, grow), moved(whole, x, r, grow)] as const);
      for (const planes of placed) {
        clipPrism(slope === 0 ? points : sheared(points, slope), count, planes[round ? 1 : 0], 0, clipped);
        if (clipped.from <= clipped.to) met.push([clipped.from, clipped.to]);
      }
    };
    for (const face of facesOf(back)) {
      const { a, b } = face.bounds();
      if (slope !== 0 || !apart([a[0] + bend.allowance / 2, a[1] + bend.allowance / 2, b[0], b[1]], box, x, r)) platesOf(face, bend.allowance).forEach(look);
    }
    for (const face of over) turnedOf(face, bend.allowance).forEach(look);
    const zone: Box = [-bend.allowance / 2, bend.allowance / 2, 0, thickness];
    if (slope !== 0 || !apart(zone, box, x, r)) for (const line of lines) look(bar(zone, line));
    return met;
  };
  return (behind, back, contact, over) => {
    const met = meets(behind, back, over, contact.x, contact.r, contact.slope);
    const taken = mergeIntervals(met.map(([from, to]): Interval => [from - half, to + half]));
    return mergeIntervals(contact.spans.map(([from, to]): Interval => {
      const inset = Math.max(0, Math.min(half, (to - from - gauge.minSpread) / 2));
      return [from + inset, to - inset];
    })).flatMap((span) => freeIntervals(span, taken));
  };
}

const clipped: Clipped = { separation: 0, from: 0, to: 0 };

type Box = readonly [left: number, right: number, bottom: number, top: number];

/** Does the box round a finger at (x, r) stay out of the other? */
function apart(one: Box, finger: Box, x: number, r: number): boolean {
  return Math.min(one[1] - finger[0] - x, finger[1] + x - one[0], one[3] - finger[2] - r, finger[3] + r - one[2]) <= SAME_POINT_MM;
}

/** The half-planes at (x, y), and longer by `grow` to the back and to the front. */
function moved(planes: Float64Array, x: number, y: number, grow: number): Float64Array {
  return planes.map((value, i) => (i % 3 === 2 ? value + (planes[i - 2] as number) * x + (planes[i - 1] as number) * y + Math.abs(planes[i - 2] as number) * grow : value));
}

const sheared = (points: Float64Array, slope: number) => points.map((value, i) => (i % 3 === 0 ? value - slope * (points[i + 2] as number) : value));

function bar([left, right, bottom, top]: Box, [from, to]: Interval): Plate {
  const ring = (z: number) => [left, bottom, z, right, bottom, z, right, top, z, left, top, z];
  return { count: 4, points: Float64Array.from([...ring(from), ...ring(to)]), round: false };
}
