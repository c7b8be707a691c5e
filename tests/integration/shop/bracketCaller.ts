import { afterAll, beforeAll } from "vitest";
import type { RouteHandler } from "@/lib/api/route";
import type { Role } from "@/lib/schemas/role";
import { database } from "@/db/client";
import { accessPeople, sessionCookie, siteRequest } from "../accessPeople";
import { cuttableGate } from "../cuttableGate";
import { bracketShop } from "./bracketShop";

export interface Answer {
  readonly status: number;
  readonly body: Record<string, unknown> & { readonly detail?: string; readonly errors?: readonly { readonly path: string; readonly message: string }[] };
}

/** The smallest shop behind the real routes, with a person of every role; its database can be taken away. */
export function bracketCaller() {
  let people: Awaited<ReturnType<typeof accessPeople>>["people"];
  let end: () => Promise<void>;
  let gate: Awaited<ReturnType<typeof cuttableGate>>;
  let machineId = "";
  beforeAll(async () => {
    ({ people, end } = await accessPeople(async (url) => (gate = await cuttableGate(url)).url));
    machineId = await bracketShop(database());
  });
  afterAll(async () => {
    await end();
    await gate.shut();
  });

  const call = async (role: Role, handler: RouteHandler, path: string, sent: { readonly params?: Record<string, string>; readonly body?: unknown; readonly raw?: string } = {}): Promise<Answer> => {
    const [method = "GET"] = handler.key.split(" ");
    const body = sent.raw ?? (sent.body === undefined ? undefined : JSON.stringify(sent.body));
    const request = siteRequest(path, {
      method, cookie: await sessionCookie(people[role].id),
      ...(body === undefined ? {} : { body, headers: { "content-type": "application/json" } }),
    });
    const response = await handler(request, { params: Promise.resolve(sent.params ?? {}) });
    return { status: response.status, body: response.status === 204 ? {} : ((await response.json()) as Answer["body"]) };
  };
  /** How many rows stand in the tables that a refused request must leave alone. */
  const rows = async (): Promise<number> => {
    const counts = await Promise.all(["parts", "part_revisions", "tools", "tool_pieces", "plans", "sheets", "audit_events"].map((table) => database()(table).count({ n: "*" }).first()));
    return counts.reduce((sum: number, count) => sum + Number((count as { n: string }).n), 0);
  };
  return { call, rows, machineId: () => machineId, person: (role: Role) => people[role], gate: () => gate };
}
