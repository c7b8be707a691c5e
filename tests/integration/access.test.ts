import { readFileSync } from "node:fs";
import ts from "typescript";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { User } from "@/db/users/user";
import type { RouteHandler } from "@/lib/api/route";
import { apiAccess, pageAccess, type Access } from "@/lib/auth/accessTable";
import { mayEnter } from "@/lib/auth/mayEnter";
import type { Problem } from "@/lib/schemas/problem";
import { roles, type Role } from "@/lib/schemas/role";
import { accessPeople, sessionCookie, siteRequest } from "./accessPeople";
import { siteTree, withUnknownIds } from "./siteTree";

const methods = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"] as const;
const apiTable: Readonly<Record<string, Access>> = apiAccess;
const pageTable: Readonly<Record<string, Access>> = pageAccess;

const handlers = (await Promise.all(siteTree("route").map(async ({ file, path }) => {
  const exported = (await import(/* @vite-ignore */ file)) as Record<string, unknown>;
  return methods.filter((method) => method in exported).map((method) => ({ key: `${method} ${path}`, method, path, handler: exported[method] as RouteHandler }));
}))).flat();
const guarded = handlers.filter(({ key }) => apiTable[key] !== "public");

describe("the access table", () => {
  it("has a row for every method of every route handler, and no row without one", () => {
    expect(handlers.map(({ key }) => key).sort()).toEqual(Object.keys(apiTable).sort());
  });

  it("has a row for every page, and no row without one", () => {
    expect(siteTree("page").map(({ path }) => path).sort()).toEqual(Object.keys(pageTable).sort());
  });

  it.each(guarded)("$key is guarded by its own row", ({ key, handler }) => {
    expect(handler.key).toBe(key);
  });

  it("leaves nothing public but signing in", () => {
    const open = Object.entries({ ...apiTable, ...pageTable }).filter(([, access]) => access === "public").map(([key]) => key);
    expect(open.sort()).toEqual(["/sign-in", "GET /api/auth/[...nextauth]", "POST /api/auth/[...nextauth]"]);
  });
});

describe("every page", () => {
  const pages = siteTree("page").filter(({ path }) => pageTable[path] !== "public");
  it.each(pages)("$path asks who may enter before anything else", ({ file, path }) => {
    const source = ts.createSourceFile(file, readFileSync(file, "utf8"), ts.ScriptTarget.ES2022, true, ts.ScriptKind.TSX);
    const page = source.statements.filter(ts.isFunctionDeclaration).find((statement) =>
      statement.modifiers?.some((modifier) => modifier.kind === ts.SyntaxKind.DefaultKeyword));
    expect(page, "a page is an exported default function").toBeDefined();
    expect(page?.body?.statements[0]?.getText()).toMatch(new RegExp(`^(const (\\w+|\\{[^}]*\\}) = )?await requirePage\\("${path.replace(/[[\]/]/g, "\\$&")}"\\);$`));
  });
});

describe("every route handler", () => {
  let people: Record<Role, User>;
  let end: () => Promise<void>;
  beforeAll(async () => {
    ({ people, end } = await accessPeople());
  });
  afterAll(() => end());

  const call = async ({ path, method, handler }: (typeof guarded)[number], cookie?: string) => {
    const params = Object.fromEntries([...path.matchAll(/\[([^\]]+)\]/g)].map(([whole, name]) => [name ?? "", withUnknownIds(whole)]));
    const sent = method === "GET" || method === "HEAD" ? {} : { body: "{}", headers: { "content-type": "application/json" } };
    return handler(siteRequest(withUnknownIds(path), { method, ...sent, ...(cookie ? { cookie } : {}) }), { params: Promise.resolve(params) });
  };

  it.each(guarded)("$key answers 401 to whoever is not signed in", async (entry) => {
    const response = await call(entry);
    expect(response.status).toBe(401);
    expect(response.headers.get("content-type")).toBe("application/problem+json");
    expect(((await response.json()) as Problem).detail).toBe("Sign in first.");
    expect((await call(entry, "foldwright.session=made.up.token")).status).toBe(401);
  });

  describe.each(roles)("asked by the %s", (role) => {
    it.each(guarded)("$key", async (entry) => {
      const response = await call(entry, await sessionCookie(people[role].id));
      if (mayEnter(role, apiTable[entry.key] ?? "public")) {
        expect(response.status).not.toBe(401);
        expect(response.status).not.toBe(403);
        expect(response.status).toBeLessThan(500);
      } else {
        expect(response.status).toBe(403);
        expect(((await response.json()) as Problem).detail).toContain(role);
      }
    });
  });
});
