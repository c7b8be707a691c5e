import type { FieldProblem } from "../core/problem";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import type { LengthUnit } from "../core/units";
import { signedArea } from "../geometry/signedArea";
import { checkBendEntry } from "./checkBendEntry";
import { checkFlanges } from "./checkFlanges";
import { checkLengths } from "./checkLengths";
import { checkOutline } from "./checkOutline";
import { documentInUnits } from "./documentInUnits";
import { formatLength } from "../core/formatLength";
import { holeAsChords } from "./holeAsChords";
import type { BaseShape, DocumentHole, FlangeEntry, FlatShape, PartDocument, ProfileShape } from "./partDocument";

/** Everything that can be said of a well-formed document without knowing its material. */
export function checkPartDocument(document: PartDocument): readonly FieldProblem[] {
  const tooLong = checkLengths(document, document.units);
  if (tooLong.length > 0) return tooLong;
  const problems: FieldProblem[] = [];
  const { units } = document;
  const inMm = documentInUnits(document, "mm");
  if (document.rule === "k" && document.kFactor === undefined) problems.push({ path: "kFactor", message: 'is missing: the rule "k" needs the K-factor' });
  if (inMm.profile) problems.push(...checkProfile(inMm.profile));
  else if (inMm.flat) problems.push(...checkFlat(inMm.flat, units));
  else problems.push(...checkFaces(inMm.base, inMm.flanges ?? [], units));
  return problems;
}

function checkProfile(profile: ProfileShape): readonly FieldProblem[] {
  const problems: FieldProblem[] = [];
  if (profile.legs.length !== profile.bends.length + 1) {
    problems.push({ path: "profile.bends", message: `${profile.legs.length} legs need ${profile.legs.length - 1} bends between them, not ${profile.bends.length}` });
  }
  return [...problems, ...profile.bends.flatMap((bend, i) => checkBendEntry(bend, `profile.bends[${i}]`))];
}

function checkFaces(base: BaseShape, flanges: readonly FlangeEntry[], units: LengthUnit): readonly FieldProblem[] {
  const outline = checkOutline(base.outline, "base.outline", units);
  return [
    ...(outline ? [outline] : []),
    ...checkHoles(base.holes, "base", units),
    ...checkFlanges(base, flanges),
    ...flanges.flatMap((flange, i) => checkFlange(flange, `flanges[${i}]`, units)),
  ];
}

function checkFlange(flange: FlangeEntry, path: string, units: LengthUnit): readonly FieldProblem[] {
  const problems = [...checkBendEntry(flange, path), ...checkHoles(flange.holes, path, units)];
  const say = (field: string, message: string) => problems.push({ path: `${path}.${field}`, message });
  if (flange.offset) {
    if (flange.hem) say("hem", "must be left out when the flange is offset");
    if (flange.outline) say("outline", "must be left out when the flange is offset; give its length");
    if (flange.strokeWith !== undefined) say("strokeWith", "must be left out when the flange is offset: its two bends are formed together");
    if (flange.angle > 90) say("angle", `is ${flange.angle}, but the two bends of an offset turn at most 90 degrees each`);
  }
  if (flange.outline) {
    if (flange.length !== undefined) say("length", "must be left out when the flange has an outline of its own");
    for (const field of ["startAngle", "endAngle"] as const) {
      if (flange[field] !== undefined) say(field, "must be left out when the flange has an outline of its own");
    }
    const outline = checkOutline(flange.outline, `${path}.outline`, units);
    if (outline) problems.push({ ...outline, message: outline.message.replace(", as seen from the top", ", first axis along the bend, second away from it") });
    else if (!beginsOnBend(flange.outline)) say("outline", `its edge 0 must run along the bend's outside line: vertices 0 and 1 at [x, 0], the second further on, and nothing below ${formatLength(0, units)}`);
  } else if (flange.length === undefined) say("length", "is missing: give the flange's length, or an outline of its own");
  return problems;
}

function beginsOnBend(outline: BaseShape["outline"]): boolean {
  const [a, b] = outline;
  return !!a && !!b && a[1] === 0 && b[1] === 0 && b[0] > a[0] && (a[2] ?? 0) === 0 && outline.every((v) => v[1] >= 0);
}

function checkFlat(flat: FlatShape, units: LengthUnit): readonly FieldProblem[] {
  const outline = checkOutline(flat.outline, "flat.outline", units);
  const problems = [...(outline ? [outline] : []), ...checkHoles(flat.holes, "flat", units)];
  flat.bends.forEach(({ id, line }, i) => {
    const first = flat.bends.findIndex((other) => other.id === id);
    if (id === "base") problems.push({ path: `flat.bends[${i}].id`, message: `"base" is the base's own name; choose another` });
    else if (first < i) problems.push({ path: `flat.bends[${i}].id`, message: `"${id}" is already the name of flat.bends[${first}]; each bend needs a name of its own` });
    if (line[0][0] === line[1][0] && line[0][1] === line[1][1]) problems.push({ path: `flat.bends[${i}].line`, message: "the bend line has no length" });
  });
  return problems;
}

function checkHoles(holes: readonly DocumentHole[] | undefined, path: string, units: LengthUnit): readonly FieldProblem[] {
  return (holes ?? []).flatMap((hole, i): readonly FieldProblem[] => {
    const at = `${path}.holes[${i}]`;
    if (!("polygon" in hole)) return Math.abs(signedArea(holeAsChords(hole))) > EMPTY_AREA_MM2 ? [] : [{ path: at, message: "the hole has no size" }];
    // Either sense is right for a hole.
    const problem = checkOutline(hole.polygon, `${at}.polygon`, units);
    return problem && !problem.message.includes("clockwise") ? [problem] : [];
  });
}
