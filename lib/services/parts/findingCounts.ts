import { setImmediate } from "node:timers/promises";
import { materialLookup } from "../materialLookup";
import { shopLimits } from "./shopLimits";
import { findingsOf } from "@/bending/findings/findingsOf";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import type { MaterialLookup } from "@/bending/handbook/material";
import { buildPart } from "@/bending/part/buildPart";
import type { PartDocument } from "@/bending/part/partDocument";
import { database } from "@/db/client";
import { findNewestDocuments } from "@/db/parts/findNewestDocuments";
import type { FindingCounts, FindingCountsView } from "@/lib/schemas/findingCounts";

/** Counts are kept until shop or materials change; this many revisions at most. */
const KEPT_MOST = 2000;
const kept = { basis: "", counts: new Map<string, FindingCounts | null>() };

/** How many findings the newest revision of each part has with the shop as it is now. */
export async function findingCounts(ids: readonly string[]): Promise<FindingCountsView> {
  const db = database();
  const [rows, materials, shop] = await Promise.all([findNewestDocuments(db, ids), materialLookup(db), shopLimits()]);
  const shopNow = JSON.stringify(shop);
  if (kept.basis !== shopNow || kept.counts.size > KEPT_MOST) {
    kept.counts.clear();
    kept.basis = shopNow;
  }
  const factsOf = new Map([...new Set(rows.map(({ document }) => document.material))].map((id) => [id, JSON.stringify(materials(id))]));
  const view: Record<string, FindingCounts | null> = {};
  for (const { part_id, revision_id, document } of rows) {
    const key = `${revision_id} ${factsOf.get(document.material) ?? ""}`;
    let counts = kept.counts.get(key);
    if (counts === undefined) {
      // Other requests get their turn between two parts.
      await setImmediate();
      counts = countsOf(document, materials, shop);
      kept.counts.set(key, counts);
    }
    view[part_id] = counts;
  }
  return view;
}

function countsOf(document: PartDocument, materials: MaterialLookup, shop: ShopLimits): FindingCounts | null {
  const part = buildPart(document, { materials });
  if (!part.ok) return null;
  const { list } = findingsOf({ part: part.value, document, shop });
  const count = (severity: "stop" | "caution" | "note") => list.filter((finding) => finding.severity === severity).length;
  return { stop: count("stop"), caution: count("caution"), note: count("note") };
}
