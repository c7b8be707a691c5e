import type { BaseShape, DocumentHole, FlangeEntry, PartDocument, ProfileBend, ProfileShape } from "@/bending/part/partDocument";
import { newBend, newFlange, newLeg, rowKey } from "./newRows";
import type { BaseDraft, BendDraft, FlangeDraft, HoleDraft, LegDraft, PartDraft } from "./partDraft";
import { startDraft } from "./startDraft";

const say = (value: number | undefined): string => (value === undefined ? "" : String(value));

/** A document made ready for editing; `documentFromDraft` gives the same document back. */
export function draftFromDocument(document: PartDocument, number = ""): PartDraft {
  const start = startDraft(document.material);
  const common: PartDraft = {
    ...start, number, name: document.name, units: document.units, thickness: say(document.thickness),
    radiusFrom: document.insideRadius === undefined ? "die" : "typed", insideRadius: say(document.insideRadius), kFactor: say(document.kFactor),
    rule: document.rule ?? "default", dimension: document.dimension ?? "outside",
    toleranceAngle: say(document.toleranceAngle), toleranceLength: say(document.toleranceLength),
  };
  if (document.profile !== undefined) return { ...common, shape: "profile", width: say(document.profile.width), legs: legsOf(document.profile) };
  if (document.base !== undefined) return { ...common, shape: "base", base: baseOf(document.base), flanges: (document.flanges ?? []).map(flangeOf) };
  return { ...common, shape: "flat", flat: document.flat ?? null };
}

function legsOf(profile: ProfileShape): readonly LegDraft[] {
  return profile.legs.map((length, i) => {
    const bend = profile.bends[i];
    return newLeg(say(length), bend === undefined ? newBend() : bendOf(bend));
  });
}

function bendOf(bend: ProfileBend | FlangeEntry): BendDraft {
  return {
    angle: say(bend.angle), direction: bend.direction, insideRadius: say(bend.insideRadius), kFactor: say(bend.kFactor),
    hem: bend.hem ?? "none", gap: say(bend.gap), toleranceAngle: say(bend.toleranceAngle),
  };
}

function baseOf(base: BaseShape): BaseDraft {
  const [a, b, c, d] = base.outline;
  const square = base.outline.length === 4 && base.outline.every((vertex) => vertex[2] === undefined) && a !== undefined && b !== undefined && c !== undefined && d !== undefined
    && a[0] === 0 && a[1] === 0 && b[1] === 0 && b[0] === c[0] && c[1] === d[1] && d[0] === 0;
  const xs = base.outline.map((vertex) => vertex[0]);
  const ys = base.outline.map((vertex) => vertex[1]);
  return {
    kind: square ? "rectangle" : "vertices",
    width: say(Math.max(...xs) - Math.min(...xs)), depth: say(Math.max(...ys) - Math.min(...ys)),
    vertices: base.outline.map((vertex) => ({ key: rowKey(), x: say(vertex[0]), y: say(vertex[1]), bulge: say(vertex[2]) })),
    holes: (base.holes ?? []).map(holeOf),
  };
}

function holeOf(hole: DocumentHole): HoleDraft {
  return "circle" in hole
    ? { key: rowKey(), kind: "circle", x: say(hole.circle[0]), y: say(hole.circle[1]), diameter: say(hole.diameter) }
    : { key: rowKey(), kind: "kept", hole };
}

function flangeOf(entry: FlangeEntry): FlangeDraft {
  return {
    ...newFlange(entry.id, entry.on, entry.edge, say(entry.length)), ...bendOf(entry),
    start: say(entry.start), end: say(entry.end), startAngle: say(entry.startAngle), endAngle: say(entry.endAngle),
    dimension: entry.dimension ?? "part", relief: entry.relief?.kind ?? "none", reliefWidth: say(entry.relief?.width), reliefDepth: say(entry.relief?.depth),
    toleranceLength: say(entry.toleranceLength), holes: (entry.holes ?? []).map(holeOf), outline: entry.outline ?? null,
  };
}
