import type { Knex } from "knex";
import type { Connection } from "../connection";
import { trialColumns, trialQuery } from "./trialQuery";
import type { TrialRow } from "./trialRow";

/** Every trial of a material, or of all; withdrawn ones only where wanted. In the order of their numbers, so that the same trials always read the same. */
export async function findAllTrials(db: Connection, { material, withdrawn = false }: { readonly material?: string | undefined; readonly withdrawn?: boolean } = {}): Promise<readonly TrialRow[]> {
  const query: Knex.QueryBuilder = trialQuery(db);
  if (material !== undefined) void query.where("trial.material_id", material);
  if (!withdrawn) void query.whereNull("trial.withdrawn_at");
  return query.select([...trialColumns(db)]).orderByRaw("length(trial.number), trial.number");
}
