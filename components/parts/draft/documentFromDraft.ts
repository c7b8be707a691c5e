import type { FieldProblem } from "@/bending/core/problem";
import type { MaterialGroup } from "@/bending/handbook/material";
import type { DraftReader } from "./draftReader";
import { createDraftReader } from "./draftReader";
import { rectangleOf } from "./rectangleOf";
import type { BendDraft, FlangeDraft, HoleDraft, PartDraft } from "./partDraft";

export interface TypedDocument {
  /** The document as far as it could be read; give it to `readPartDocument` when there are no problems. */
  readonly document: Readonly<Record<string, unknown>>;
  readonly problems: readonly FieldProblem[];
}

/** Reads what was typed into a part document; texts that are no numbers become problems at their path. */
export function documentFromDraft(draft: PartDraft, materialGroup: MaterialGroup | undefined): TypedDocument {
  const read = createDraftReader(draft.units);
  const document = {
    format: "part/1", name: draft.name.trim(), units: draft.units, material: draft.material,
    thickness: read.length("thickness", draft.thickness, materialGroup ?? "steel"),
    ...(draft.radiusFrom === "typed" ? { insideRadius: read.length("insideRadius", draft.insideRadius) } : {}),
    ...read.optionalNumber("kFactor", draft.kFactor),
    ...(draft.rule === "default" ? {} : { rule: draft.rule }),
    ...(draft.dimension === "outside" ? {} : { dimension: draft.dimension }),
    ...read.optionalAngle("toleranceAngle", draft.toleranceAngle),
    ...read.optionalLength("toleranceLength", draft.toleranceLength),
    ...(draft.grain === "absent" ? {} : { grain: draft.grain === "angle" ? read.angle("grain", draft.grainAngle) : draft.grain }),
    ...cutsOf(draft, "", read),
    ...shapeOf(draft, read),
  };
  return { document, problems: read.problems };
}

function shapeOf(draft: PartDraft, read: DraftReader): Readonly<Record<string, unknown>> {
  switch (draft.shape) {
    case "flat": return { flat: draft.flat === null ? null : {
      ...draft.flat,
      bends: draft.flat.bends.map(({ id, line, ...kept }, i) => { const bend = draft.flatBends[i]; return { id, line, ...(bend === undefined ? kept : bendOf(bend, `flat.bends[${i}]`, "", read)) }; }),
    } };
    case "profile": return { profile: {
      width: read.length("profile.width", draft.width),
      legs: draft.legs.map((leg, i) => read.length(`profile.legs[${i}]`, leg.length)),
      bends: draft.legs.slice(0, -1).map((leg, i) => bendOf(leg.bend, `profile.bends[${i}]`, "", read)),
    } };
    case "base": return {
      base: { outline: outlineOf(draft, read), ...holesOf(draft.base.holes, "base.holes", read) },
      flanges: draft.flanges.map((flange, i) => flangeOf(flange, `flanges[${i}]`, read)),
    };
    default: return draft.shape satisfies never;
  }
}

function outlineOf({ base }: PartDraft, read: DraftReader): readonly (readonly number[])[] {
  if (base.kind === "rectangle") {
    const width = read.length("base.width", base.width);
    const depth = read.length("base.depth", base.depth);
    if (width <= 0) read.report("base.width", "The base must be wider than 0.");
    if (depth <= 0) read.report("base.depth", "The base must be deeper than 0.");
    return [[0, 0], [width, 0], [width, depth], [0, depth]];
  }
  return base.vertices.map((vertex, i) => {
    const at = `base.outline[${i}]`;
    const point = [read.length(`${at}[0]`, vertex.x), read.length(`${at}[1]`, vertex.y)];
    return vertex.bulge.trim() === "" ? point : [...point, read.number(`${at}[2]`, vertex.bulge)];
  });
}

function holesOf(holes: readonly HoleDraft[], at: string, read: DraftReader) {
  return holes.length === 0 ? {} : { holes: holes.map((hole, i) => holeOf(hole, `${at}[${i}]`, read)) };
}

function holeOf(hole: HoleDraft, at: string, read: DraftReader) {
  const length = (field: string, text: string) => read.length(`${at}.${field}`, text);
  switch (hole.kind) {
    case "kept": return hole.hole;
    case "circle": return { circle: [length("circle[0]", hole.x), length("circle[1]", hole.y)], diameter: length("diameter", hole.diameter) };
    case "slot": return { slot: [[length("slot[0][0]", hole.x), length("slot[0][1]", hole.y)], [length("slot[1][0]", hole.toX), length("slot[1][1]", hole.toY)]], width: length("width", hole.width) };
    case "rectangle": {
      const [width, height] = [length("polygon.width", hole.width), length("polygon.height", hole.height)];
      if (width <= 0) read.report(`${at}.polygon.width`, "A rectangle must be wider than 0.");
      if (height <= 0) read.report(`${at}.polygon.height`, "A rectangle must be higher than 0.");
      return { polygon: rectangleOf(length("polygon[0][0]", hole.x), length("polygon[0][1]", hole.y), width, height) };
    }
    default: return hole satisfies never;
  }
}

/** Relief and corner of the part (`at` empty) or of a flange. */
function cutsOf({ relief, corner }: Pick<PartDraft, "relief" | "corner">, at: string, read: DraftReader) {
  const path = at === "" ? "" : `${at}.`;
  return {
    ...(relief.kind === "absent" ? {} : { relief: {
      kind: relief.kind,
      ...(relief.kind === "none" ? {} : { ...read.optionalLength(`${path}relief.width`, relief.width), ...read.optionalLength(`${path}relief.depth`, relief.depth) }),
    } }),
    ...(corner.kind === "absent" ? {} : { corner: corner.kind === "open" ? { kind: "open" } : { kind: "mitre", gap: read.length(`${path}corner.gap`, corner.gap) } }),
  };
}

function bendOf(bend: BendDraft, at: string, toleranceLength: string, read: DraftReader) {
  return {
    angle: read.angle(`${at}.angle`, bend.angle), direction: bend.direction,
    ...read.optionalLength(`${at}.insideRadius`, bend.insideRadius),
    ...read.optionalNumber(`${at}.kFactor`, bend.kFactor),
    ...(bend.hem === "none" ? {} : { hem: bend.hem }),
    ...read.optionalLength(`${at}.gap`, bend.hem === "none" ? "" : bend.gap),
    ...read.optionalAngle(`${at}.toleranceAngle`, bend.toleranceAngle),
    ...read.optionalLength(`${at}.toleranceLength`, toleranceLength),
    ...(bend.strokeWith.trim() === "" ? {} : { strokeWith: bend.strokeWith.trim() }),
  };
}

function flangeOf(flange: FlangeDraft, at: string, read: DraftReader) {
  return {
    id: flange.id.trim(), on: flange.on, edge: flange.edge,
    ...(flange.outline === null ? { length: read.length(`${at}.length`, flange.length) } : { outline: flange.outline }),
    ...bendOf(flange, at, flange.toleranceLength, read),
    ...read.optionalLength(`${at}.start`, flange.start),
    ...read.optionalLength(`${at}.end`, flange.end),
    ...read.optionalAngle(`${at}.startAngle`, flange.startAngle),
    ...read.optionalAngle(`${at}.endAngle`, flange.endAngle),
    ...(flange.dimension === "part" ? {} : { dimension: flange.dimension }),
    ...cutsOf(flange, at, read),
    ...(flange.offsetHeight.trim() === "" ? {} : { offset: { height: read.length(`${at}.offset.height`, flange.offsetHeight) } }),
    ...holesOf(flange.holes, `${at}.holes`, read),
  };
}
