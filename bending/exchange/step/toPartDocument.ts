import { SOLID_MATCH_MM } from "../../core/tolerance";
import { outsideSetback } from "../../handbook/outsideSetback";
import { deg, mm, toDeg, toRad, rad } from "../../core/units";
import type { DocumentHole, FlangeEntry, PartDocument } from "../../part/partDocument";
import { drawFlange, type DrawnPlate } from "./drawFlange";
import type { ImportChoices } from "./importChoices";
import { placedHole } from "./placedHole";
import { tidy } from "./tidy";
import type { RecognisedPart } from "./recognisedPart";
import { windowHole } from "./windowHole";

/**
 * A recognised part as a part document: the base and a flange a bend. The plates keep their plane shape (`dimension` tangent: lengths end
 * where a bend begins), radius and angle stand with each bend, so the folded part is the solid and the flat follows from the rule.
 * Cut-outs across bends are left closed unless the bends' `allowances` (mm) are given.
 */
export function toPartDocument(part: RecognisedPart, choices: ImportChoices, allowances: readonly number[] = []): PartDocument {
  const thickness = choices.thickness ?? tidy(part.thickness);
  const names = part.plates.map((_, i) => (i === 0 ? "base" : `b${i}`));
  const base = part.plates[0];
  const holesOf = (index: number): readonly DocumentHole[] => [
    ...(part.plates[index]?.holes ?? []),
    ...part.bends.flatMap((bend, i) => (bend.parent === index && allowances[i] !== undefined
      ? bend.windows.map((window): DocumentHole => ({ polygon: windowHole(window, bend, part.plates[index]?.outline ?? [], allowances[i] ?? 0) })) : [])),
  ];
  const flanges: FlangeEntry[] = [];
  const drawn: DrawnPlate[] = [{ edges: (base?.outline ?? []).map((_, i) => ({ edge: i, number: i, extended: 0 })) }];
  part.bends.forEach((bend, i) => {
    const plate = part.plates[bend.child];
    if (!plate) return;
    const insideRadius = choices.bends?.[i]?.insideRadius ?? tidy(bend.insideRadius);
    const angle = choices.bends?.[i]?.angle ?? Math.min(180, tidy(toDeg(rad(bend.angle))));
    const setback = outsideSetback(toRad(deg(angle)), mm(insideRadius), mm(thickness));
    const parentEdge = drawn[bend.parent]?.edges.find(({ edge }) => edge === bend.parentEdge);
    const flange = drawFlange(plate, bend, setback);
    drawn.push(flange.plate);
    const start = (Math.abs(bend.start) <= SOLID_MATCH_MM ? 0 : tidy(bend.start)) + (parentEdge?.extended ?? 0);
    flanges.push({
      id: names[bend.child] ?? "", on: names[bend.parent] ?? "base", edge: parentEdge?.number ?? 0,
      outline: flange.outline, angle, direction: bend.direction,
      ...(angle === 180 ? { hem: "open" as const, gap: 2 * insideRadius } : { insideRadius }),
      ...(start > 0 ? { start } : {}),
      ...(holesOf(bend.child).length > 0 ? { holes: holesOf(bend.child).map((hole) => placedHole(hole, ([x, y]) => [x, setback - y], true)) } : {}),
    });
  });
  return {
    format: "part/1", name: choices.name, units: "mm", material: choices.material, thickness, dimension: "tangent",
    ...(choices.rule ? { rule: choices.rule } : {}),
    ...(choices.kFactor === undefined ? {} : { kFactor: choices.kFactor }),
    base: {
      outline: (base?.outline ?? []).map(([x, y, bulge]) => (bulge === 0 ? [tidy(x), tidy(y)] : [tidy(x), tidy(y), bulge])),
      ...(holesOf(0).length > 0 ? { holes: holesOf(0).map((hole) => placedHole(hole, (p) => p, false)) } : {}),
    },
    ...(flanges.length > 0 ? { flanges } : {}),
  };
}
