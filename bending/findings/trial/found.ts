import { materialById } from "../../handbook/materials";
import { invariant } from "../../core/invariant";
import { buildPart } from "../../part/buildPart";
import type { PartDocument } from "../../part/partDocument";
import type { PartModel } from "../../part/partModel";
import type { Finding, FindingRule } from "../finding";
import { findingsOf } from "../findingsOf";
import type { ShopLimits } from "../shopLimits";
import { trialShop } from "./trialShop";

export function built(document: PartDocument): PartModel {
  const part = buildPart(document, { materials: materialById, keepOverlaps: true });
  invariant(part.ok, part.ok ? "" : JSON.stringify(part.error));
  return part.value;
}

/** The findings of a document that has to build; those of one rule when it is named. */
export function found(document: PartDocument, rule?: FindingRule, shop: ShopLimits | null = trialShop): readonly Finding[] {
  return findingsOf({ part: built(document), document, shop }).list.filter((finding) => rule === undefined || finding.rule === rule);
}
