import { afterAll, beforeAll, expect, it } from "vitest";
import { ok } from "@/bending/core/result";
import { insertEvent } from "@/db/audit/insertEvent";
import { database } from "@/db/client";
import type { User } from "@/db/users/user";
import { route } from "@/lib/api/route";
import { authorizeSignIn } from "@/lib/auth/authorizeSignIn";
import type { Problem } from "@/lib/schemas/problem";
import type { Role } from "@/lib/schemas/role";
import { GET as listPeople } from "@/app/api/people/route";
import { accessPassword, accessPeople, sessionCookie, siteRequest } from "./accessPeople";
import { cuttableGate } from "./cuttableGate";

let people: Record<Role, User>;
let end: () => Promise<void>;
let gate: Awaited<ReturnType<typeof cuttableGate>>;
beforeAll(async () => {
  ({ people, end } = await accessPeople(async (url) => {
    gate = await cuttableGate(url);
    return gate.url;
  }));
});
afterAll(async () => {
  await end();
  await gate.shut();
});

const ask = async (handler: typeof listPeople) =>
  handler(siteRequest("/api/people", { cookie: await sessionCookie(people.manager.id) }), { params: Promise.resolve({}) });
const event = (subject: string) => ({ actorId: people.manager.id, actor: "The manager", action: "tried", subject });
const kept = async (subject: string) => (await database()("audit_events").where({ subject })).length;

it("answers 503 while the database is away, and works again when it is back", async () => {
  expect((await ask(listPeople)).status).toBe(200);
  await gate.shut();
  const lost = await ask(listPeople);
  expect(lost.status).toBe(503);
  expect(lost.headers.get("retry-after")).toBe("30");
  expect(((await lost.json()) as Problem).detail).toContain("database cannot be reached");
  await expect(authorizeSignIn({ email: people.manager.email, password: accessPassword }, "192.0.2.1")).rejects.toThrow("database-lost");
  await gate.reopen();
  expect((await ask(listPeople)).status).toBe(200);
  expect(await authorizeSignIn({ email: people.manager.email, password: accessPassword }, "192.0.2.1")).toMatchObject({ role: "manager" });
});

it("keeps nothing of a change that the connection was lost in the middle of", async () => {
  const cutInside = route("GET /api/people", {
    run: async () => {
      await database().transaction(async (trx) => {
        await insertEvent(trx, event("first half"));
        await gate.shut();
        await insertEvent(trx, event("second half"));
      });
      return ok(null);
    },
  });
  expect((await ask(cutInside)).status).toBe(503);
  await gate.reopen();
  expect(await kept("first half")).toBe(0);
  expect(await kept("second half")).toBe(0);
});
