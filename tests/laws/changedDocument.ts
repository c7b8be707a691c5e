import type { DocumentHole, DocumentVertex, FlangeEntry, PartDocument } from "@/bending/part/partDocument";

/** Edge `k` of a face whose outline has so many corners, where it lies after the outline was mirrored and turned counter-clockwise again. */
const mirroredEdge = (edge: number, corners: number): number => (corners - 2 - edge + corners) % corners;
const other = { up: "down", down: "up" } as const;

/** The part seen in a mirror across the bed: left and right change places, up and down do not. For profiles and for bases with flanges without outlines of their own. */
export function mirroredPart(document: PartDocument): PartDocument {
  if (!document.base) return document;
  const corners = document.base.outline.length;
  const point = ([x, y]: DocumentVertex): DocumentVertex => [-x, y];
  const hole = (one: DocumentHole): DocumentHole => ("polygon" in one ? { polygon: [...one.polygon].reverse().map(point) } : one);
  return {
    ...document,
    base: { ...document.base, outline: [...document.base.outline].reverse().map(point), ...(document.base.holes ? { holes: document.base.holes.map(hole) } : {}) },
    flanges: (document.flanges ?? []).map((flange): FlangeEntry => {
      const { start, end, startAngle, endAngle, ...rest } = flange;
      return {
        ...rest,
        edge: flange.on === "base" ? mirroredEdge(flange.edge, corners) : (4 - flange.edge) % 4,
        ...(end === undefined ? {} : { start: end }), ...(start === undefined ? {} : { end: start }),
        ...(endAngle === undefined ? {} : { startAngle: endAngle }), ...(startAngle === undefined ? {} : { endAngle: startAngle }),
      };
    }),
  };
}

/** A profile drawn from its other end. */
export function reversedProfile(document: PartDocument): PartDocument {
  const { profile } = document;
  return profile ? { ...document, profile: { ...profile, legs: [...profile.legs].reverse(), bends: [...profile.bends].reverse() } } : document;
}

/** The part turned over: what went up goes down. */
export function turnedOver(document: PartDocument): PartDocument {
  const { profile, flanges } = document;
  if (profile) return { ...document, profile: { ...profile, bends: profile.bends.map((bend) => ({ ...bend, direction: other[bend.direction] })) } };
  // Seen from its other side the sheet is mirrored.
  const mirrored = mirroredPart(document);
  return flanges && mirrored.flanges ? { ...mirrored, flanges: mirrored.flanges.map((flange) => ({ ...flange, direction: other[flange.direction] })) } as PartDocument : mirrored;
}

/** Other ids for the flanges; profiles have no names of their own. */
export function renamedFlanges(document: PartDocument, name: (id: string) => string): PartDocument {
  if (!document.flanges) return document;
  return { ...document, flanges: document.flanges.map((flange) => ({ ...flange, id: name(flange.id), on: flange.on === "base" ? "base" : name(flange.on) })) };
}

/** The flanges listed the other way round, each after the one that it stands on. */
export function relistedFlanges(document: PartDocument): PartDocument {
  if (!document.flanges) return document;
  const waiting = [...document.flanges].reverse();
  const listed: FlangeEntry[] = [];
  while (waiting.length > 0) {
    const next = waiting.findIndex(({ on }) => on === "base" || listed.some(({ id }) => id === on));
    listed.push(...waiting.splice(Math.max(0, next), 1));
  }
  return { ...document, flanges: listed };
}

/** The same part written in inches. */
export function inInches(document: PartDocument): PartDocument {
  const inch = (length: number) => length / 25.4;
  const vertex = (v: DocumentVertex): DocumentVertex => (v.length === 3 ? [inch(v[0]), inch(v[1]), v[2]] : [inch(v[0]), inch(v[1])]);
  const common = { ...document, units: "in" as const, thickness: inch(document.thickness), ...(document.insideRadius === undefined ? {} : { insideRadius: inch(document.insideRadius) }) };
  if (document.profile) return { ...common, profile: { ...document.profile, width: inch(document.profile.width), legs: document.profile.legs.map(inch) } } as PartDocument;
  if (!document.base) return document;
  return {
    ...common,
    base: { outline: document.base.outline.map(vertex) },
    flanges: (document.flanges ?? []).map((flange) => ({
      ...flange, ...(flange.length === undefined ? {} : { length: inch(flange.length) }), ...(flange.start === undefined ? {} : { start: inch(flange.start) }), ...(flange.end === undefined ? {} : { end: inch(flange.end) }),
    })),
  } as PartDocument;
}
