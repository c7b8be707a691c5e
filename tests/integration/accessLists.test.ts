import { afterAll, beforeAll, expect, it } from "vitest";
import { GET as getActivity } from "@/app/api/activity/route";
import { GET as getPeople } from "@/app/api/people/route";
import { insertEvent } from "@/db/audit/insertEvent";
import { database } from "@/db/client";
import { insertUser } from "@/db/users/insertUser";
import { updateUser } from "@/db/users/updateUser";
import type { User } from "@/db/users/user";
import type { RouteHandler } from "@/lib/api/route";
import type { Problem } from "@/lib/schemas/problem";
import type { Role } from "@/lib/schemas/role";
import type { ActivityItem, Page, PersonItem } from "@/lib/schemas/views";
import { accessPeople, sessionCookie, siteRequest } from "./accessPeople";

let people: Record<Role, User>;
let end: () => Promise<void>;
beforeAll(async () => {
  ({ people, end } = await accessPeople());
  for (let index = 1; index <= 30; index += 1) {
    await insertEvent(database(), { actorId: people.engineer.id, actor: "The engineer", action: "saved a part", subject: `RS-${index}`, detail: index === 7 ? "100 % <i>checked</i>" : "" });
  }
});
afterAll(() => end());

async function read<T>(handler: RouteHandler, address: string): Promise<{ status: number; body: T }> {
  const response = await handler(siteRequest(address, { cookie: await sessionCookie(people.manager.id) }), { params: Promise.resolve({}) });
  return { status: response.status, body: (await response.json()) as T };
}
const activity = async (query = "") => (await read<Page<ActivityItem>>(getActivity, `/api/activity${query}`)).body;
const listed = async (query = "") => (await read<Page<PersonItem>>(getPeople, `/api/people${query}`)).body;

it("lists what was done, newest first, every event once over the pages", async () => {
  const pages = [await activity("?pageSize=12"), await activity("?pageSize=12&page=2"), await activity("?pageSize=12&page=3")];
  expect(pages.map(({ items, total }) => [items.length, total])).toEqual([[12, 30], [12, 30], [6, 30]]);
  const items = pages.flatMap((page) => page.items);
  expect(new Set(items.map(({ id }) => id)).size).toBe(30);
  expect(items[0]).toMatchObject({ actor: "The engineer", action: "saved a part" });
  expect([...items].sort((a, b) => (a.at < b.at ? 1 : -1)).map(({ at }) => at)).toEqual(items.map(({ at }) => at));
});

it("finds text anywhere in an event; signs of patterns stand for themselves", async () => {
  expect((await activity("?q=rs-30")).items.map(({ subject }) => subject)).toEqual(["RS-30"]);
  expect((await activity("?q=100+%25+%3Ci")).items.map(({ subject }) => subject)).toEqual(["RS-7"]);
  expect((await activity("?q=_")).total).toBe(0);
  expect((await activity("?q='--")).total).toBe(0);
});

it("lists people with their roles and without their passwords", async () => {
  const page = await listed("?sort=role&dir=desc");
  expect(page.items.map(({ role }) => role)).toEqual(["toolroom", "operator", "manager", "engineer"]);
  expect(Object.keys(page.items[0] ?? {}).sort()).toEqual(["active", "email", "id", "name", "role"]);
  expect((await listed("?q=ENGINEER")).items.map(({ email }) => email)).toEqual(["engineer@access.example"]);
  await updateUser(database(), people.operator.id, { disabled: true });
  expect((await listed("?q=operator")).items[0]?.active).toBe(false);
});

it.each([["?page=0", "page"], ["?page=x", "page"], ["?pageSize=101", "pageSize"], ["?sort=password_hash", "sort"], ["?dir=up", "dir"], [`?q=${"q".repeat(101)}`, "q"]])("answers 400 to %s and names it", async (query, path) => {
  for (const [handler, address] of [[getPeople, "/api/people"], [getActivity, "/api/activity"]] as const) {
    const { status, body } = await read<Problem>(handler, `${address}${query}`);
    expect(status).toBe(400);
    expect(body.errors?.map((error) => error.path)).toEqual([path]);
  }
});

it("keeps accounts sound in the database itself", async () => {
  const { passwordHash } = people.engineer;
  const person = { email: "new@access.example", name: "New", role: "engineer", passwordHash } as const;
  await expect(insertUser(database(), { ...person, email: "ENGINEER@access.example" })).rejects.toMatchObject({ code: "23505" });
  await expect(insertUser(database(), { ...person, passwordHash: "plain text" })).rejects.toMatchObject({ constraint: "users_password_hashed" });
  await expect(insertUser(database(), { ...person, name: "  " })).rejects.toMatchObject({ constraint: "users_name_given" });
  await expect(database()("users").where({ id: people.engineer.id }).update({ role: "owner" })).rejects.toMatchObject({ constraint: "users_role_known" });
});
