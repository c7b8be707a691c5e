import type { Connection } from "../connection";

/** The attempt succeeded: the account's earlier failures no longer count. Those of the address do. */
export async function settleAttempt(db: Connection, attemptId: string): Promise<void> {
  await db("sign_in_attempts").where({ id: attemptId }).update({ succeeded: true });
}
