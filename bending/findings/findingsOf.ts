import type { FlatPattern } from "../part/flatPattern";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import { createContext, type FindingsContext } from "./context";
import { cutOutsNearBends } from "./cutOutsNearBends";
import { deepSheets } from "./deepSheets";
import type { Finding } from "./finding";
import { flatsOverlapping } from "./flatsOverlapping";
import { forces } from "./forces";
import { heavyBlank } from "./heavyBlank";
import { hems } from "./hems";
import { holesNearBends } from "./holesNearBends";
import { largeBlank } from "./largeBlank";
import { longBends } from "./longBends";
import { meetsItself } from "./meetsItself";
import { missingReliefs } from "./missingReliefs";
import { sharpAngles } from "./sharpAngles";
import { shortFlanges } from "./shortFlanges";
import type { ShopLimits } from "./shopLimits";
import { tightRadii } from "./tightRadii";
import { vOpenings } from "./vOpenings";

export interface FindingsQuestion {
  readonly part: PartModel;
  /** The document that the part was built from: its unit, its fields. */
  readonly document: PartDocument;
  /** What the shop has; null when it is not known. */
  readonly shop: ShopLimits | null;
  /** The part's flat, where the caller has it already. */
  readonly flat?: FlatPattern | undefined;
}

export interface Findings {
  /** Those that stop first; otherwise rule by rule, in the order of faces and bends. */
  readonly list: readonly Finding[];
  /** Rules that were not asked, because the shop (or that part of it) is not known, in words. */
  readonly leftOut: readonly string[];
}

const RULES: readonly ((context: FindingsContext) => readonly Finding[])[] = [
  flatsOverlapping, meetsItself, vOpenings, sharpAngles, shortFlanges, hems, longBends, deepSheets, largeBlank, forces,
  holesNearBends, cutOutsNearBends, missingReliefs, tightRadii, heavyBlank,
];

const WEIGHT = { stop: 0, caution: 1, note: 2 } as const;

/** Everything that the handbook and the shop have to say against a part as it is drawn. The same part gives the same findings in the same order. */
export function findingsOf({ part, document, shop, flat }: FindingsQuestion): Findings {
  const context = createContext(part, document, shop, flat);
  const list = RULES.flatMap((rule) => rule(context)).map((finding, i) => ({ finding, i }))
    .sort((a, b) => WEIGHT[a.finding.severity] - WEIGHT[b.finding.severity] || a.i - b.i).map(({ finding }) => finding);
  return { list, leftOut: leftOut(shop) };
}

function leftOut(shop: ShopLimits | null): readonly string[] {
  if (!shop) return ["what the shop’s tools, brakes and stock sheets can do"];
  return [
    ...(shop.punches.length === 0 ? ["how sharp the punches go"] : []),
    ...(shop.machines.length === 0 ? ["bed, throat and force of the brakes"] : []),
    ...(shop.stock.length === 0 ? ["the stock sheets"] : []),
  ];
}
