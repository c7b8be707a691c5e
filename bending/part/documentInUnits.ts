import { mmPer, type LengthUnit } from "../core/units";
import type { BaseShape, CornerEntry, DocumentHole, DocumentVertex, FlangeEntry, FlatShape, PartDocument, ProfileShape, ReliefEntry } from "./partDocument";

/** The same part with its lengths in the given unit; angles, bulges and names stay. */
export function documentInUnits(document: PartDocument, units: LengthUnit): PartDocument {
  if (document.units === units) return document;
  const factor = mmPer(document.units) / mmPer(units);
  const length = (value: number) => value * factor;
  const shape = document.profile
    ? { profile: profileScaled(document.profile, length) }
    : document.flat
      ? { flat: flatScaled(document.flat, length) }
      : { base: baseScaled(document.base, length), ...(document.flanges ? { flanges: document.flanges.map((f) => flangeScaled(f, length)) } : {}) };
  return { ...cutsScaled(scaled(document, ["thickness", "insideRadius", "toleranceLength"], length), length), ...shape, units } as PartDocument;
}

type Length = (value: number) => number;

/** A copy with the named fields scaled; fields that are absent stay absent. */
function scaled<T extends object>(value: T, fields: readonly (keyof T)[], length: Length): T {
  const copy = { ...value };
  for (const field of fields) {
    const old = copy[field];
    if (typeof old === "number") copy[field] = length(old) as T[keyof T] & number;
  }
  return copy;
}

/** A copy with the sizes of its reliefs and corners scaled. */
function cutsScaled<T extends { readonly relief?: ReliefEntry; readonly corner?: CornerEntry }>(value: T, length: Length): T {
  return {
    ...value,
    ...(value.relief ? { relief: scaled(value.relief, ["width", "depth"], length) } : {}),
    ...(value.corner?.kind === "mitre" ? { corner: { ...value.corner, gap: length(value.corner.gap) } } : {}),
  };
}

const pointScaled = (p: readonly [number, number], length: Length): readonly [number, number] => [length(p[0]), length(p[1])];

const vertexScaled = (v: DocumentVertex, length: Length): DocumentVertex =>
  v.length === 3 ? [length(v[0]), length(v[1]), v[2]] : [length(v[0]), length(v[1])];

function holeScaled(hole: DocumentHole, length: Length): DocumentHole {
  if ("circle" in hole) return { circle: pointScaled(hole.circle, length), diameter: length(hole.diameter) };
  if ("slot" in hole) return { slot: [pointScaled(hole.slot[0], length), pointScaled(hole.slot[1], length)], width: length(hole.width) };
  return { polygon: hole.polygon.map((v) => vertexScaled(v, length)) };
}

const holesScaled = <T extends { readonly holes?: readonly DocumentHole[] }>(value: T, length: Length): T =>
  value.holes ? { ...value, holes: value.holes.map((hole) => holeScaled(hole, length)) } : value;

const profileScaled = (profile: ProfileShape, length: Length): ProfileShape => ({
  width: length(profile.width),
  legs: profile.legs.map(length),
  bends: profile.bends.map((bend) => scaled(bend, ["insideRadius", "gap"], length)),
});

const baseScaled = (base: BaseShape, length: Length): BaseShape => ({
  ...holesScaled(base, length),
  outline: base.outline.map((v) => vertexScaled(v, length)),
});

const flatScaled = (flat: FlatShape, length: Length): FlatShape => ({
  ...holesScaled(flat, length),
  outline: flat.outline.map((v) => vertexScaled(v, length)),
  bends: flat.bends.map((bend) => ({
    ...scaled(bend, ["insideRadius", "gap"], length),
    line: [pointScaled(bend.line[0], length), pointScaled(bend.line[1], length)],
  })),
  ...(flat.base ? { base: pointScaled(flat.base, length) } : {}),
});

function flangeScaled(flange: FlangeEntry, length: Length): FlangeEntry {
  return {
    ...holesScaled(cutsScaled(scaled(flange, ["length", "gap", "start", "end", "insideRadius", "toleranceLength"], length), length), length),
    ...(flange.outline ? { outline: flange.outline.map((v) => vertexScaled(v, length)) } : {}),
    ...(flange.offset ? { offset: { height: length(flange.offset.height) } } : {}),
  };
}
