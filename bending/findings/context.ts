import { toDeg, type LengthUnit } from "../core/units";
import { springback } from "../handbook/springback";
import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import { flatPattern, type FlatPattern } from "../part/flatPattern";
import type { PartDocument } from "../part/partDocument";
import type { Bend, PartModel } from "../part/partModel";
import { documentFields, type DocumentFields } from "./documentFields";
import { type BendTools, bendTools } from "./bendTools";
import type { ShopLimits } from "./shopLimits";

/** What every rule looks at; made once for a part. Lengths in mm. */
export interface FindingsContext {
  readonly part: PartModel;
  readonly units: LengthUnit;
  readonly flat: FlatPattern;
  readonly fields: DocumentFields;
  /** Null: what depends on the shop is left out. */
  readonly shop: ShopLimits | null;
  /** For each bend the rectangle round its zone. */
  readonly zoneBoxes: readonly Bounds2[];
  /** For each face the bends on its edges, as indices. */
  readonly bendsOn: readonly (readonly number[])[];
  /** Which of the shop's dies and punches could make this bend; the usual V stands in when there is no shop. */
  readonly toolsOf: (bend: Bend) => BendTools;
  /** Degrees that the bend is taken to, springback and all. */
  readonly demandedOf: (bend: Bend) => number;
}

export function createContext(part: PartModel, document: PartDocument, shop: ShopLimits | null, flat: FlatPattern = flatPattern(part)): FindingsContext {
  const bendsOn: number[][] = part.faces.map(() => []);
  part.bends.forEach(({ parent, child }, i) => {
    bendsOn[parent]?.push(i);
    bendsOn[child]?.push(i);
  });
  // Bends of one part are mostly alike, so what is worked out for one serves many.
  const demandedOf = remembered((bend) => toDeg(springback(bend.angle, bend.insideRadius, part.thickness, part.material).angle));
  const toolsOf = remembered((bend) => bendTools(part, demandedOf(bend), shop));
  return { part, units: document.units, flat, fields: documentFields(document), shop, zoneBoxes: part.bends.map(({ zone }) => polygonBounds(zone)), bendsOn, toolsOf, demandedOf };
}

function remembered<T>(ask: (bend: Bend) => T): (bend: Bend) => T {
  const known = new Map<string, T>();
  return (bend) => {
    const key = `${bend.angle} ${bend.insideRadius}`;
    const before = known.get(key);
    if (before !== undefined) return before;
    const answer = ask(bend);
    known.set(key, answer);
    return answer;
  };
}
