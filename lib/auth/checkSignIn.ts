import { insertEvent } from "@/db/audit/insertEvent";
import { insertEventOnce } from "@/db/audit/insertEventOnce";
import { database } from "@/db/client";
import { attemptLimits } from "@/db/signIn/attemptLimits";
import { claimAttempt } from "@/db/signIn/claimAttempt";
import { settleAttempt } from "@/db/signIn/settleAttempt";
import { findUserByEmail } from "@/db/users/findUserByEmail";
import { fail, ok, type Result } from "@/bending/core/result";
import { passwordMatches } from "./passwordMatches";
import type { SignedInPerson } from "./signedInPerson";
import type { SignInErrorCode } from "./signInErrors";

export interface SignInRefusal {
  readonly code: SignInErrorCode;
  readonly retryAfterSeconds?: number;
}

/** Checks an e-mail address and a password against the limits and the database; every outcome leaves a trace. */
export async function checkSignIn(given: { email: string; password: string; address: string }): Promise<Result<SignedInPerson, SignInRefusal>> {
  const db = database();
  const email = given.email.trim().toLowerCase().slice(0, 254);
  const nobody = { actorId: null, actor: "not signed in", subject: email };
  const claim = await claimAttempt(db, email, given.address);
  if (!claim.allowed) {
    const detail = `${claim.by === "account" ? "too many failures of this account" : "too many failures from one address"}, from ${given.address}`;
    await insertEventOnce(db, { ...nobody, action: "sign-in refused for a while", detail }, attemptLimits.windowMinutes);
    return fail({ code: "too-many-attempts", retryAfterSeconds: claim.retryAfterSeconds });
  }

  const user = await findUserByEmail(db, email);
  if (!(await passwordMatches(given.password, user?.passwordHash ?? null)) || !user) {
    await insertEvent(db, { ...nobody, action: "sign-in failed", detail: `from ${given.address}` });
    return fail({ code: "CredentialsSignin" });
  }
  if (user.disabledAt) {
    await insertEvent(db, { ...nobody, action: "sign-in failed", detail: `the account is switched off; from ${given.address}` });
    return fail({ code: "account-off" });
  }
  await db.transaction(async (trx) => {
    await settleAttempt(trx, claim.attemptId);
    await insertEvent(trx, { actorId: user.id, actor: user.name, action: "signed in", subject: user.email, detail: `from ${given.address}` });
  });
  return ok({ id: user.id, name: user.name, email: user.email, role: user.role });
}
