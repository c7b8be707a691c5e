import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { attemptLimits } from "@/db/signIn/attemptLimits";
import { claimAttempt } from "@/db/signIn/claimAttempt";
import { updateUser } from "@/db/users/updateUser";
import type { User } from "@/db/users/user";
import { authorizeSignIn } from "@/lib/auth/authorizeSignIn";
import { checkSignIn } from "@/lib/auth/checkSignIn";
import { signInMessage } from "@/lib/auth/signInErrors";
import type { Role } from "@/lib/schemas/role";
import { accessPassword, accessPeople } from "./accessPeople";

let people: Record<Role, User>;
let end: () => Promise<void>;
beforeAll(async () => {
  ({ people, end } = await accessPeople());
});
afterAll(() => end());
beforeEach(async () => {
  await database()("sign_in_attempts").delete();
  await database()("audit_events").delete();
});

const email = "engineer@access.example";
const address = "192.0.2.7";
const right = (from = address) => checkSignIn({ email, password: accessPassword, address: from });
const wrong = (of = email, from = address) => checkSignIn({ email: of, password: "a wrong password", address: from });
const times = async (count: number, work: (index: number) => Promise<unknown>) => {
  for (let index = 0; index < count; index += 1) await work(index);
};
const age = (minutes: number) => database()("sign_in_attempts").update({ at: database().raw("at - make_interval(mins => ?)", [minutes]) });
const actions = async (): Promise<string[]> => database()("audit_events").orderBy("id").pluck("action");
const limited = { ok: false, error: { code: "too-many-attempts" } };

describe("signing in", () => {
  it("answers the person, whatever case the address is typed in", async () => {
    const { id, name, role } = people.engineer;
    expect(await checkSignIn({ email: "  ENGINEER@Access.example ", password: accessPassword, address })).toEqual({ ok: true, value: { id, name, email, role } });
    expect(await actions()).toEqual(["signed in"]);
  });

  it("does not tell a wrong password from an unknown account", async () => {
    const refusal = { ok: false, error: { code: "CredentialsSignin" } };
    expect(await wrong()).toEqual(refusal);
    expect(await wrong("nobody@access.example")).toEqual(refusal);
    expect(await checkSignIn({ email, password: `${accessPassword} `, address })).toEqual(refusal);
    expect(await actions()).toEqual(["sign-in failed", "sign-in failed", "sign-in failed"]);
  });

  it("tells a switched-off account only to whoever knows its password", async () => {
    await updateUser(database(), people.engineer.id, { disabled: true });
    expect(await wrong()).toMatchObject({ error: { code: "CredentialsSignin" } });
    expect(await right()).toMatchObject({ error: { code: "account-off" } });
    await updateUser(database(), people.engineer.id, { disabled: false });
    expect(await right()).toMatchObject({ ok: true });
  });

  it.each([[undefined], [{}], [{ email: "", password: "" }], [{ email, password: "p".repeat(2000) }], [{ email: ["a"], password: {} }]])("refuses %j without counting it", async (given) => {
    expect(await authorizeSignIn(given, address)).toBeNull();
    expect(await database()("sign_in_attempts").select()).toEqual([]);
  });
});

describe("the limit of an account", () => {
  it("refuses even the right password after so many failures, says how long, and ends by itself", async () => {
    await times(attemptLimits.perAccount, () => wrong());
    await expect(authorizeSignIn({ email, password: accessPassword }, address)).rejects.toThrow(/^too-many-attempts:\d+$/);
    const refused = await right("198.51.100.1");
    expect(refused).toMatchObject(limited);
    const seconds = refused.ok ? 0 : (refused.error.retryAfterSeconds ?? 0);
    expect(seconds).toBeGreaterThan((attemptLimits.windowMinutes - 1) * 60);
    expect(seconds).toBeLessThanOrEqual(attemptLimits.windowMinutes * 60);
    expect(signInMessage(`too-many-attempts:${seconds}`)).toMatch(/Try again in 15 minutes\.$/);
    await age(attemptLimits.windowMinutes);
    expect(await right()).toMatchObject({ ok: true });
  });

  it("is one below: the right password is still taken, and clears the count", async () => {
    await times(attemptLimits.perAccount - 1, () => wrong());
    expect(await right()).toMatchObject({ ok: true });
    await times(attemptLimits.perAccount - 1, () => wrong());
    expect(await right()).toMatchObject({ ok: true });
  });

  it("holds for an unknown account as well, and for each account by itself", async () => {
    await times(attemptLimits.perAccount, () => wrong("nobody@access.example"));
    expect(await wrong("Nobody@access.example")).toMatchObject(limited);
    expect(await right()).toMatchObject({ ok: true });
  });

  it("is not stretched by asking while it lasts, nor does that fill the record", async () => {
    await times(attemptLimits.perAccount, () => wrong());
    await age(attemptLimits.windowMinutes - 1);
    await times(4, () => wrong());
    expect(await actions()).toEqual([...Array<string>(attemptLimits.perAccount).fill("sign-in failed"), "sign-in refused for a while"]);
    await age(1);
    expect(await right()).toMatchObject({ ok: true });
  });

  it("cannot be outrun by attempts made at once", async () => {
    const claims = await Promise.all(Array.from({ length: 25 }, (_, index) => claimAttempt(database(), email, `203.0.113.${index}`)));
    expect(claims.filter((claim) => claim.allowed)).toHaveLength(attemptLimits.perAccount);
  });
});

describe("the limit of an address", () => {
  it("stops one address from trying many accounts, though it signs in to its own between", async () => {
    await times(attemptLimits.perAddress, async (index) => {
      if (index % 7 === 0) expect(await right()).toMatchObject({ ok: true });
      await wrong(`person${index}@access.example`);
    });
    expect(await right()).toMatchObject(limited);
    expect(await right("198.51.100.1")).toMatchObject({ ok: true });
  });
});
