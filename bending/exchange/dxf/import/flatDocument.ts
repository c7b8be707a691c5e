import type { LengthUnit } from "../../../core/units";
import { documentInUnits } from "../../../part/documentInUnits";
import type { BendDirection, DocumentHole, DocumentVertex, FlatBendEntry, PartDocument } from "../../../part/partDocument";
import type { Vec2 } from "../../../geometry/vec2";
import { bulgedBounds } from "../contour/bulgedBounds";
import type { Loop } from "../contour/piece";
import type { FoundBend, FoundFlat } from "./foundFlat";

/** What a drawing does not say, or a person says otherwise. Lengths in mm. */
export interface FlatFacts {
  readonly name: string;
  readonly material: string;
  readonly thickness: number;
  readonly insideRadius?: number | undefined;
  /** The unit that the document shall be in. */
  readonly units: LengthUnit;
  /** By the bend's place in the list; what is absent is taken from the drawing, else 90 degrees. */
  readonly bends?: readonly Partial<BendFacts>[] | undefined;
}

export interface BendFacts {
  readonly angle: number;
  readonly direction: BendDirection;
  readonly insideRadius: number;
  readonly kFactor: number;
}

/** Angle of a bend line that nothing is said of: nearly every bend is square. */
const USUAL_ANGLE = 90;

/**
 * The part document of a flat found in a drawing, its lower left corner moved to 0, 0; null when there is no contour. It is not yet
 * checked: `readPartDocument` and `buildPart` say what is wrong with it.
 */
export function flatDocument({ outline, holes, bends }: FoundFlat, facts: FlatFacts): PartDocument | null {
  if (!outline) return null;
  const corner = bulgedBounds(outline.vertices).min;
  const point = ([x, y]: Vec2): readonly [number, number] => [rounded(x - corner[0]), rounded(y - corner[1])];
  const vertices = (loop: Loop) => loop.vertices.map(([x, y, bulge]): DocumentVertex => (bulge === 0 ? point([x, y]) : [...point([x, y]), Number(bulge.toFixed(9))]));
  const ids = idsOf(bends);
  const document: PartDocument = {
    format: "part/1", name: facts.name, units: "mm", material: facts.material, thickness: facts.thickness,
    ...(facts.insideRadius === undefined ? {} : { insideRadius: facts.insideRadius }),
    flat: {
      outline: vertices(outline),
      ...(holes.length === 0 ? {} : { holes: holes.map((hole): DocumentHole => (hole.circle ? { circle: point(hole.circle.centre), diameter: rounded(2 * hole.circle.radius) } : { polygon: vertices(hole) })) }),
      bends: bends.map((bend, i) => entryOf(bend, ids[i] ?? `b${i + 1}`, facts.bends?.[i] ?? {}, point)),
    },
  };
  return documentInUnits(document, facts.units);
}

function entryOf({ line, direction, data }: FoundBend, id: string, said: Partial<BendFacts>, point: (p: Vec2) => readonly [number, number]): FlatBendEntry {
  const insideRadius = said.insideRadius ?? data?.insideRadius;
  const kFactor = said.kFactor ?? data?.k ?? undefined;
  const hem = said.angle === undefined || said.angle === data?.angle ? data?.hem : null;
  return {
    id, line: [point(line[0]), point(line[1])], angle: said.angle ?? data?.angle ?? USUAL_ANGLE, direction: said.direction ?? direction,
    ...(hem ? { hem } : {}),
    ...(insideRadius === undefined || hem === "closed" ? {} : { insideRadius }),
    ...(kFactor === undefined || hem === "closed" ? {} : { kFactor }),
  };
}

/** Ids as the file gives them where they do not clash, else b1, b2, ... */
function idsOf(bends: readonly FoundBend[]): readonly string[] {
  const taken = new Set(["base"]);
  const own = bends.map(({ data }) => { const free = data && !taken.has(data.id) ? data.id : null; if (free) taken.add(free); return free; });
  let next = 1;
  return own.map((id) => {
    if (id) return id;
    while (taken.has(`b${next}`)) next += 1;
    taken.add(`b${next}`);
    return `b${next}`;
  });
}

/** Nanometres: what comes from a file with six decimals keeps them, and no noise beyond. */
const rounded = (value: number): number => Number(value.toFixed(6)) + 0;
