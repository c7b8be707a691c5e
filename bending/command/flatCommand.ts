import { mmPer } from "../core/units";
import { findingsOf } from "../findings/findingsOf";
import { flatPattern } from "../part/flatPattern";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import { flatLength } from "../plan/flatLength";
import { planFlat } from "../plan/planFlat";
import { rounded } from "../plan/rounded";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import type { Arguments } from "./readArguments";
import { readShop } from "./readShop";
import { writeFindings } from "./writeFindings";

/** The flat pattern: numbers as in a plan, the outline, holes and bend lines to cut and to bend by, and what is wrong with the part. */
export function flatCommand(given: Arguments, document: PartDocument, part: PartModel, world: CommandWorld): CommandOutcome {
  const shop = readShop(given, world);
  if (!shop.ok) return wrongInput(shop.error);
  const flat = planFlat(part, document.units);
  const pattern = flatPattern(part);
  const point = (p: readonly [number, number]) => [rounded(p[0] / mmPer(document.units)), rounded(p[1] / mmPer(document.units))];
  return {
    exitCode: 0,
    error: null,
    json: {
      part: part.name,
      units: document.units,
      material: part.material.id,
      flatLength: flatLength(document, flat),
      ...flat,
      bends: flat.bends.map((bend, index) => ({ ...bend, radiusSource: part.bends[index]?.radiusSource })),
      outline: pattern.outline.map(point),
      holes: pattern.holes.map((hole) => hole.map(point)),
      bendLines: pattern.bendLines.map(({ id, line, angle, direction }) => ({ id, line: line.map(point), angle: rounded((angle * 180) / Math.PI), direction })),
      ...writeFindings(findingsOf({ part, document, shop: shop.value }), document.units),
    },
  };
}
