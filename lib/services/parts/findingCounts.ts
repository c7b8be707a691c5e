import { createHash } from "node:crypto";
import { setImmediate } from "node:timers/promises";
import { loadShopTable } from "../bendTable/loadShopTable";
import { shopLimits } from "./shopLimits";
import { findingsOf } from "@/bending/findings/findingsOf";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import { buildPart, type BuildPartOptions } from "@/bending/part/buildPart";
import type { PartDocument } from "@/bending/part/partDocument";
import { database } from "@/db/client";
import type { Connection } from "@/db/connection";
import { findNewestDocuments } from "@/db/parts/findNewestDocuments";
import type { FindingCounts, FindingCountsView } from "@/lib/schemas/findingCounts";

/** Counts are kept by revision and by all that they depend on; this many at most. */
const KEPT_MOST = 2000;
const kept = new Map<string, FindingCounts | null>();

/** How many findings the newest revision of each part has with the shop as it is now. */
export async function findingCounts(ids: readonly string[]): Promise<FindingCountsView> {
  const db = database();
  const [rows, shop] = await Promise.all([findNewestDocuments(db, ids), shopLimits()]);
  const bases = await basesOf(db, rows.map(({ document }) => document.material), shop);
  const view: Record<string, FindingCounts | null> = {};
  for (const { part_id, revision_id, document } of rows) {
    const basis = bases.get(document.material);
    if (!basis) continue;
    const key = `${revision_id} ${basis.digest}`;
    let counts = kept.get(key);
    if (counts === undefined) {
      // Other requests get their turn between two parts.
      await setImmediate();
      counts = countsOf(document, basis.options, shop);
      if (kept.size >= KEPT_MOST) kept.clear();
      kept.set(key, counts);
    }
    view[part_id] = counts;
  }
  return view;
}

interface Basis { readonly options: BuildPartOptions; readonly digest: string }

async function basesOf(db: Connection, materials: readonly string[], shop: ShopLimits): Promise<ReadonlyMap<string, Basis>> {
  const pairs = await Promise.all([...new Set(materials)].map(async (material): Promise<[string, Basis]> => {
    const { materials: lookup, table } = await loadShopTable(db, material);
    const digest = createHash("sha256").update(JSON.stringify([lookup(material), table, shop])).digest("hex");
    return [material, { options: { materials: lookup, shopTable: table }, digest }];
  }));
  return new Map(pairs);
}

function countsOf(document: PartDocument, options: BuildPartOptions, shop: ShopLimits): FindingCounts | null {
  const part = buildPart(document, options);
  if (!part.ok) return null;
  const { list } = findingsOf({ part: part.value, document, shop });
  const count = (severity: "stop" | "caution" | "note") => list.filter((finding) => finding.severity === severity).length;
  return { stop: count("stop"), caution: count("caution"), note: count("note") };
}
