/** A point in the middle plane of a stroke: x from the punch's middle, y up from the die's top plane. */
type Point = readonly [number, number];

/** The right half of a die as what a drawing gives: where the V is named at, and what it measures there. */
export interface DrawnDie {
  readonly opening: number;
  readonly named: "tops" | "corners";
  readonly shoulderRadius: number;
  /** Angle between the two faces, radians. */
  readonly dieAngle: number;
}

export interface BentSheet {
  /** Turned through under load, radians. */
  readonly angle: number;
  readonly insideRadius: number;
  readonly thickness: number;
}

export interface Rest {
  /** How far the lowest point of the sheet lies under the die's top plane. */
  readonly depth: number;
  /** From the apex of the outside surfaces along the wing to where it touches the die. */
  readonly contactFromApex: number;
}

const SAMPLES = 600;
const HALVINGS = 36;

function bisect(low: number, high: number, isLow: (value: number) => boolean): number {
  let [from, to] = [low, high];
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (from + to) / 2;
    if (isLow(middle)) from = middle;
    else to = middle;
  }
  return (from + to) / 2;
}

/** Points of the right shoulder: along the face, round the arc, along the top plane. The arc's place is found by rolling it out of the corner. */
export function shoulderPoints({ opening, named, shoulderRadius, dieAngle }: DrawnDie): readonly Point[] {
  const half = dieAngle / 2;
  // Downwards along the face, towards the middle.
  const down: Point = [-Math.sin(half), -Math.cos(half)];
  const fromFace = ([x, y]: Point, corner: number) => (x - corner) * Math.cos(half) + y * -Math.sin(half);
  const corner = named === "corners" ? opening / 2 : bisect(0, opening / 2, (at) => fromFace([opening / 2, -shoulderRadius], at) > shoulderRadius);
  const middle = bisect(corner, corner + 10 * shoulderRadius, (x) => fromFace([x, -shoulderRadius], corner) < shoulderRadius);
  const turn = Math.PI / 2 - half;
  return Array.from({ length: SAMPLES + 1 }, (_, i): readonly Point[] => {
    const part = i / SAMPLES;
    const way = Math.PI / 2 + turn * (1 - part);
    const arcStart: Point = [middle + shoulderRadius * Math.cos(Math.PI / 2 + turn), -shoulderRadius + shoulderRadius * Math.sin(Math.PI / 2 + turn)];
    const along = part * opening;
    return [
      [middle + shoulderRadius * Math.cos(way), -shoulderRadius + shoulderRadius * Math.sin(way)],
      ...(i % 20 === 0 ? [[arcStart[0] + along * down[0], arcStart[1] + along * down[1]], [middle + along, 0]] as const : []),
    ];
  }).flat();
}

/**
 * Sheet of even thickness, wrapped on a punch nose of its inside radius, straight beyond, let down until it rests on the shoulders. No
 * tangency is solved for: the die is points, the sheet an inequality, the depth is halved down to.
 */
export function restOnDie({ angle, insideRadius, thickness }: BentSheet, die: DrawnDie): Rest {
  const points = shoulderPoints(die);
  const reach = insideRadius + thickness;
  const [cos, sin] = [Math.cos(angle / 2), Math.sin(angle / 2)];
  /** How far a point lies under the sheet's lower surface, the arc's middle at height `middle`; less than 0 inside or above. */
  const below = ([x, y]: Point, middle: number) =>
    (Math.abs(Math.atan2(x, middle - y)) <= angle / 2 ? Math.hypot(x, y - middle) : x * sin - (y - middle) * cos) - reach;
  const nearest = (depth: number): readonly [number, Point] => {
    let found: readonly [number, Point] = [Infinity, [NaN, NaN]];
    for (const point of points) {
      const free = below(point, reach - depth);
      if (free < found[0]) found = [free, point];
    }
    return found;
  };
  const depth = bisect(0, 4 * die.opening, (value) => nearest(value)[0] > 0);
  const [, touched] = nearest(depth);
  const apex = reach - depth - reach / cos;
  return { depth, contactFromApex: touched[0] * cos + (touched[1] - apex) * sin };
}
