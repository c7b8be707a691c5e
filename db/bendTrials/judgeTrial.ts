import type { Connection } from "../connection";

export type TrialJudgement =
  /** Stays on record and in sight, but does not count. */
  | { readonly state: "excluded"; readonly reason: string }
  /** Counts again. */
  | { readonly state: "counted" }
  /** Taken back for good: it was never true. */
  | { readonly state: "withdrawn"; readonly reason: string };

/** Changes whether a trial counts. Answers false when there is no such trial or it was withdrawn. */
export async function judgeTrial(db: Connection, id: string, judgement: TrialJudgement, by: string): Promise<boolean> {
  const now = db.fn.now();
  const change = judgement.state === "counted"
    ? { excluded_at: null, excluded_by: null, excluded_reason: null }
    : judgement.state === "excluded"
      ? { excluded_at: now, excluded_by: by, excluded_reason: judgement.reason }
      : { withdrawn_at: now, withdrawn_by: by, withdrawn_reason: judgement.reason };
  return (await db("bend_trials").where({ id }).whereNull("withdrawn_at").update(change)) === 1;
}
