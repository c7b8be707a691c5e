import { convexHull } from "../geometry/convexHull";
import type { Vec2 } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { Bend, PartModel } from "../part/partModel";
import { bendLines } from "./bendLines";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";
import { shownLength } from "./shownLength";

/**
 * Bends that have more sheet on both sides than any throat takes, and are too wide to go between the frames. While other bends are
 * still flat this is what the sheet measures; folding one side first can bring it down, so it is a caution unless the two faces at
 * the bend are that deep by themselves.
 */
export function deepSheets(context: FindingsContext): readonly Finding[] {
  const { part, shop, units } = context;
  if (!shop || shop.machines.length === 0) return [];
  const throat = Math.max(...shop.machines.map(({ throatDepth }) => throatDepth as number));
  const across = Math.hypot(...[0, 1].map((axis) => (context.flat.bounds.max[axis] ?? 0) - (context.flat.bounds.min[axis] ?? 0)));
  // Nothing can be deeper than the whole blank, and what goes between the frames may be as deep as it will.
  if (across <= throat) return [];
  const hull = convexHull(context.flat.outline);
  const between = Math.max(...shop.machines.map(({ betweenFrames }) => betweenFrames as number));
  return part.bends.flatMap((bend, index): readonly Finding[] => {
    if (extentAlong(hull, bend) <= between) return [];
    const ways = reaches(part, bend, index);
    const passes = shop.machines.some(({ throatDepth, betweenFrames }) => Math.min(ways.parentSide, ways.childSide) <= throatDepth || ways.along <= betweenFrames);
    if (passes) return [];
    const alone = Math.min(ways.parentAlone, ways.childAlone);
    const never = !shop.machines.some(({ throatDepth, betweenFrames }) => alone <= throatDepth || ways.along <= betweenFrames);
    const least = Math.min(ways.parentSide, ways.childSide);
    const length = (value: number) => shownLength(value, units);
    return [{
      key: `throat ${bend.id}`,
      rule: "throat",
      severity: never ? "stop" : "caution",
      title: "Deeper than the throat",
      message: `At bend ${bend.id} at least ${length(least)} of flat sheet lies behind the die, and it is ${length(ways.along)} wide there; the deepest throat is ${length(throat)}, and no frames stand that far apart.${never ? "" : " Other bends on that side would have to be made first."}`,
      source: "the shop’s brakes",
      faces: [part.faces[bend.parent]?.id ?? "", part.faces[bend.child]?.id ?? ""],
      bends: [bend.id],
      paths: [],
      marks: bendLines([bend]),
      measure: { value: least, wanted: throat, unit: "mm" },
      cure: null,
    }];
  });
}

function extentAlong(points: readonly Vec2[], bend: Bend): number {
  const { along } = bendDirections(bend);
  const values = points.map(([x, y]) => x * along[0] + y * along[1]);
  return Math.max(...values) - Math.min(...values);
}

interface Reaches {
  /** How far the flat sheet reaches from the bend line: all of a side, and the face at the bend alone. */
  readonly parentSide: number;
  readonly childSide: number;
  readonly parentAlone: number;
  readonly childAlone: number;
  /** Its extent along the bend. */
  readonly along: number;
}

function reaches(part: PartModel, bend: Bend, index: number): Reaches {
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay);
  const beyond = new Set([bend.child]);
  part.bends.forEach(({ parent, child }, i) => { if (i !== index && beyond.has(parent)) beyond.add(child); });
  let [parentSide, childSide, parentAlone, childAlone, low, high] = [0, 0, 0, 0, Infinity, -Infinity];
  part.faces.forEach(({ outline }, face) => {
    for (const [x, y] of outline) {
      const off = Math.abs(((x - ax) * (by - ay) - (y - ay) * (bx - ax)) / length);
      const along = ((x - ax) * (bx - ax) + (y - ay) * (by - ay)) / length;
      low = Math.min(low, along);
      high = Math.max(high, along);
      if (beyond.has(face)) childSide = Math.max(childSide, off);
      else parentSide = Math.max(parentSide, off);
      if (face === bend.child) childAlone = Math.max(childAlone, off);
      if (face === bend.parent) parentAlone = Math.max(parentAlone, off);
    }
  });
  return { parentSide, childSide, parentAlone, childAlone, along: high - low };
}
