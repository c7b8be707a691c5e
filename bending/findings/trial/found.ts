import { materialById } from "../../handbook/materials";
import { invariant } from "../../core/invariant";
import { buildPart } from "../../part/buildPart";
import type { PartDocument } from "../../part/partDocument";
import type { Finding, FindingRule } from "../finding";
import { findingsOf } from "../findingsOf";
import type { ShopLimits } from "../shopLimits";
import { trialShop } from "./trialShop";

/** The findings of a document that has to build; those of one rule when it is named. */
export function found(document: PartDocument, rule?: FindingRule, shop: ShopLimits | null = trialShop): readonly Finding[] {
  const part = buildPart(document, { materials: materialById });
  invariant(part.ok, part.ok ? "" : JSON.stringify(part.error));
  return findingsOf({ part: part.value, document, shop }).list.filter((finding) => rule === undefined || finding.rule === rule);
}
