import type { Connection } from "../connection";
import { trialColumns, trialQuery } from "./trialQuery";
import type { TrialRow } from "./trialRow";

export async function findTrialsById(db: Connection, ids: readonly string[]): Promise<readonly TrialRow[]> {
  return trialQuery(db).whereIn("trial.id", [...ids]).select([...trialColumns(db)]).orderByRaw("length(trial.number), trial.number");
}
