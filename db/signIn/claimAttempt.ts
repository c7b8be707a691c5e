import type { Knex } from "knex";
import type { Connection } from "../connection";
import { attemptLimits } from "./attemptLimits";

export type AttemptClaim =
  | { readonly allowed: true; readonly attemptId: string }
  | { readonly allowed: false; readonly by: "account" | "address"; readonly retryAfterSeconds: number };

const { perAccount, perAddress, windowMinutes } = attemptLimits;

/**
 * Takes one attempt out of what the account and the address have left; it counts as failed until it is settled, so that
 * attempts made at once cannot share the last one. A refused attempt is not counted: the wait ends however often one asks.
 */
export async function claimAttempt(db: Connection, email: string, address: string): Promise<AttemptClaim> {
  return db.transaction(async (trx) => {
    await trx.raw("select pg_advisory_xact_lock(7001, hashtext(?))", [email]);
    await trx.raw("select pg_advisory_xact_lock(7002, hashtext(?))", [address]);
    await trx("sign_in_attempts").where("at", "<", trx.raw("now() - interval '1 day'")).delete();

    const account = await wait(trx, { email }, perAccount, lastSuccess(trx, email));
    if (account !== null) return { allowed: false, by: "account", retryAfterSeconds: account };
    const place = await wait(trx, { address }, perAddress);
    if (place !== null) return { allowed: false, by: "address", retryAfterSeconds: place };

    const [attempt] = await trx("sign_in_attempts").insert({ email, address }).returning<{ id: string }[]>("id");
    return { allowed: true, attemptId: attempt!.id };
  });
}

const lastSuccess = (trx: Knex.Transaction, email: string) =>
  trx("sign_in_attempts").where({ email, succeeded: true }).select(trx.raw("coalesce(max(id), 0)"));

/** Seconds until the oldest of the last `limit` failures leaves the window; null when there are fewer. */
async function wait(trx: Knex.Transaction, who: { email: string } | { address: string }, limit: number, after?: Knex.QueryBuilder): Promise<number | null> {
  const failures = trx("sign_in_attempts")
    .where({ ...who, succeeded: false })
    .where("at", ">", trx.raw(`now() - interval '${windowMinutes} minutes'`))
    .orderBy("at", "desc")
    .offset(limit - 1)
    .first(trx.raw(`extract(epoch from at + interval '${windowMinutes} minutes' - now())::float8 as seconds`));
  if (after) void failures.where("id", ">", after);
  const oldest = (await failures) as { seconds: number } | undefined;
  return oldest ? Math.max(1, Math.ceil(oldest.seconds)) : null;
}
