import type { BaseShape, DocumentHole, FlangeEntry, FlatBendEntry, PartDocument, ProfileBend, ProfileShape } from "@/bending/part/partDocument";
import { newBend, newFlange, newLeg, rowKey } from "./newRows";
import { rectangleOf } from "./rectangleOf";
import type { BaseDraft, BendDraft, CornerDraft, FlangeDraft, HoleDraft, LegDraft, PartDraft, ReliefDraft } from "./partDraft";
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
    grain: document.grain === undefined ? "absent" : typeof document.grain === "number" ? "angle" : document.grain, grainAngle: typeof document.grain === "number" ? say(document.grain) : "",
    ...cutsOf(document),
  };
  if (document.profile !== undefined) return { ...common, shape: "profile", width: say(document.profile.width), legs: legsOf(document.profile) };
  if (document.base !== undefined) return { ...common, shape: "base", base: baseOf(document.base), flanges: (document.flanges ?? []).map(flangeOf) };
  return { ...common, shape: "flat", flat: document.flat ?? null, flatBends: (document.flat?.bends ?? []).map(bendOf) };
}

function cutsOf({ relief, corner }: Pick<FlangeEntry, "relief" | "corner">) {
  return {
    relief: { kind: relief?.kind ?? "absent", width: say(relief?.width), depth: say(relief?.depth) } satisfies ReliefDraft,
    corner: { kind: corner?.kind ?? "absent", gap: corner?.kind === "mitre" ? say(corner.gap) : "" } satisfies CornerDraft,
  };
}

function legsOf(profile: ProfileShape): readonly LegDraft[] {
  return profile.legs.map((length, i) => {
    const bend = profile.bends[i];
    return newLeg(say(length), bend === undefined ? newBend() : bendOf(bend));
  });
}

function bendOf(bend: ProfileBend | FlangeEntry | FlatBendEntry): BendDraft {
  return {
    angle: say(bend.angle), direction: bend.direction, insideRadius: say(bend.insideRadius), kFactor: say(bend.kFactor),
    hem: bend.hem ?? "none", gap: say(bend.gap), toleranceAngle: say(bend.toleranceAngle), strokeWith: bend.strokeWith ?? "",
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
  if ("circle" in hole) return { key: rowKey(), kind: "circle", x: say(hole.circle[0]), y: say(hole.circle[1]), diameter: say(hole.diameter) };
  if ("slot" in hole) {
    const [from, to] = hole.slot;
    return { key: rowKey(), kind: "slot", x: say(from[0]), y: say(from[1]), toX: say(to[0]), toY: say(to[1]), width: say(hole.width) };
  }
  const [corner, , opposite] = hole.polygon;
  if (corner !== undefined && opposite !== undefined) {
    const [width, height] = [opposite[0] - corner[0], opposite[1] - corner[1]];
    const same = JSON.stringify(rectangleOf(corner[0], corner[1], width, height)) === JSON.stringify(hole.polygon);
    if (same && width > 0 && height > 0) return { key: rowKey(), kind: "rectangle", x: say(corner[0]), y: say(corner[1]), width: say(width), height: say(height) };
  }
  return { key: rowKey(), kind: "kept", hole };
}

function flangeOf(entry: FlangeEntry): FlangeDraft {
  return {
    ...newFlange(entry.id, entry.on, entry.edge, say(entry.length)), ...bendOf(entry),
    start: say(entry.start), end: say(entry.end), startAngle: say(entry.startAngle), endAngle: say(entry.endAngle),
    dimension: entry.dimension ?? "part", ...cutsOf(entry), offsetHeight: say(entry.offset?.height),
    toleranceLength: say(entry.toleranceLength), holes: (entry.holes ?? []).map(holeOf), outline: entry.outline ?? null,
  };
}
