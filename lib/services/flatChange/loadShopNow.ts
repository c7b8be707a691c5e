import type { MaterialLookup } from "@/bending/handbook/material";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { shopTable } from "@/bending/shopTable/shopTable";
import { bendTrialFromRow } from "@/db/bendTrials/bendTrialFromRow";
import { findAllTrials } from "@/db/bendTrials/findAllTrials";
import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { Connection } from "@/db/connection";
import { findMaterials } from "@/db/materials/findMaterials";
import type { MaterialRow } from "@/db/materials/materialRow";

/** What a flat would be computed from now, and the trials behind it, withdrawn ones too. */
export interface ShopNow {
  readonly materials: ReadonlyMap<string, MaterialRow>;
  readonly lookup: MaterialLookup;
  readonly table: ShopTable;
  /** By the key of the cell that a trial is filed under. */
  readonly trialsOf: ReadonlyMap<string, readonly TrialRow[]>;
}

/** The materials named, as they are now, and what the shop has measured of them. */
export async function loadShopNow(db: Connection, materialIds: readonly string[]): Promise<ShopNow> {
  const ids = [...new Set(materialIds)];
  const [rows, trials] = await Promise.all([findMaterials(db, { ids }), findAllTrials(db, { material: ids.length === 1 ? ids[0] : undefined, withdrawn: true })]);
  const materials = new Map(rows.map((row) => [row.id, row]));
  const lookup: MaterialLookup = (id) => materials.get(id)?.facts;
  const own = trials.filter((trial) => materials.has(trial.material_id));
  const filed = (some: readonly TrialRow[]) => shopTable(some.map(bendTrialFromRow), lookup);
  const everyTrial = filed(own);
  const standing = own.filter((trial) => trial.withdrawn_at === null);
  const byId = new Map(own.map((trial) => [trial.id, trial]));
  const trialsOf = new Map(everyTrial.cells.map((cell) => [cell.key, cell.trials.flatMap(({ id }) => byId.get(id) ?? [])]));
  return { materials, lookup, table: standing.length === own.length ? everyTrial : filed(standing), trialsOf };
}
