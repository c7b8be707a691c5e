import { expect, request as playwrightRequest, test, type APIRequestContext } from "@playwright/test";
import { apiAccess, pageAccess, type Access } from "../../lib/auth/accessTable";
import { mayEnter } from "../../lib/auth/mayEnter";
import { roles, type Role } from "../../lib/schemas/role";
import { demonstrationPassword } from "../../seeds/shop/demonstrationPassword";
import { people } from "../../seeds/shop/people";

const unknownIds = (pattern: string) => pattern.replace(/\[[^\]]+\]/g, "00000000-0000-4000-8000-000000000000");
/** What a route needs beside the ids in its path, to have something to answer. */
const asks: Readonly<Record<string, string>> = {
  "GET /api/finding-counts": "?ids=00000000-0000-4000-8000-000000000000",
  "GET /api/parts/[id]/drawing": "?format=svg",
  "GET /api/bend-table/coverage": "?material=S235",
  "GET /api/shop-table": "?material=S235",
};
const guardedPages = Object.entries<Access>(pageAccess).filter(([, access]) => access !== "public");
const guardedRoutes = Object.entries<Access>(apiAccess).filter(([, access]) => access !== "public");

async function signIn(visitor: APIRequestContext, email: string, password: string) {
  const { csrfToken } = (await (await visitor.get("/api/auth/csrf")).json()) as { csrfToken: string };
  return visitor.post("/api/auth/callback/credentials", { form: { email, password, csrfToken, json: "true" } });
}

const emailOf = (role: Role): string => {
  const person = people.find((one) => one.role === role);
  if (!person) throw new Error(`nobody in the demonstration shop is ${role}`);
  return person.email;
};

/** Where a page sends the visitor: a redirect, or one written into a page whose sending had begun. */
async function sentTo(visitor: APIRequestContext, path: string): Promise<{ status: number; to: string | null }> {
  const response = await visitor.get(path, { maxRedirects: 0 });
  const location = response.headers()["location"];
  if (location) return { status: response.status(), to: new URL(location, response.url()).pathname };
  const streamed = /NEXT_REDIRECT;(?:push|replace);([^;]+);/.exec(await response.text())?.[1];
  return { status: response.status(), to: streamed ? new URL(streamed, response.url()).pathname : null };
}

test.describe("signed out", () => {
  for (const [path] of guardedPages) {
    test(`${path} leads to sign in`, async ({ request }) => {
      expect((await sentTo(request, unknownIds(path))).to).toBe("/sign-in");
    });
  }

  test("every route answers 401, with a problem document", async ({ request }) => {
    for (const [key] of guardedRoutes) {
      const [method = "", path = ""] = key.split(" ");
      const response = await request.fetch(unknownIds(path), { method, ...(method === "GET" ? {} : { data: {} }) });
      expect(response.status(), key).toBe(401);
      expect(response.headers()["content-type"], key).toContain("application/problem+json");
    }
  });

  test("a wrong password answers no session", async ({ request }) => {
    const response = await signIn(request, "nobody@ravelstreet.example", "not a password of anyone");
    expect(response.status()).toBe(401);
    expect(((await response.json()) as { url: string }).url).toContain("error=CredentialsSignin");
    expect((await sentTo(request, "/")).to).toBe("/sign-in");
  });
});

for (const role of roles) {
  test.describe(`signed in as ${role}`, () => {
    let visitor: APIRequestContext;
    test.beforeAll(async ({ baseURL }) => {
      visitor = await playwrightRequest.newContext(baseURL ? { baseURL } : {});
      const response = await signIn(visitor, emailOf(role), demonstrationPassword);
      expect(response.status()).toBe(200);
    });
    test.afterAll(() => visitor.dispose());

    test("the session cookie is out of reach of scripts and of other sites", async () => {
      const { cookies } = await visitor.storageState();
      const session = cookies.find(({ name }) => name.endsWith("foldwright.session"));
      expect(session).toMatchObject({ httpOnly: true, sameSite: "Lax", path: "/" });
    });

    test("every page opens to this role, or leads to /forbidden", async () => {
      for (const [path, access] of guardedPages) {
        const { status, to } = await sentTo(visitor, unknownIds(path));
        expect(status, path).toBeLessThan(500);
        if (mayEnter(role, access)) expect(["/sign-in", "/forbidden"], path).not.toContain(to);
        else expect(to, path).toBe("/forbidden");
      }
    });

    test("every route that reads answers this role, or 403", async () => {
      for (const [key, access] of guardedRoutes.filter(([each]) => each.startsWith("GET "))) {
        const response = await visitor.get(`${unknownIds(key.slice("GET ".length))}${asks[key] ?? ""}`);
        if (mayEnter(role, access)) expect([200, 404], key).toContain(response.status());
        else expect(response.status(), key).toBe(403);
      }
    });

    test("a write that comes from a page of another site is refused", async () => {
      for (const [key] of guardedRoutes.filter(([each]) => !each.startsWith("GET "))) {
        const [method = "", path = ""] = key.split(" ");
        const response = await visitor.fetch(unknownIds(path), { method, data: {}, headers: { origin: "https://elsewhere.example" } });
        expect(response.status(), key).toBe(403);
      }
    });
  });
}

test("a document of 10 MB is refused with the limit named, and nothing is kept of it", async ({ request }) => {
  await signIn(request, emailOf("engineer"), demonstrationPassword);
  const total = async () => ((await (await request.get("/api/parts")).json()) as { total: number }).total;
  const before = await total();
  const response = await request.post("/api/parts", { data: { document: { format: "part/1", name: "n".repeat(10_000_000) } } });
  expect(response.status()).toBe(413);
  expect(((await response.json()) as { detail: string }).detail).toContain("2 MB");
  expect(await total()).toBe(before);
});

test("pages carry a content security policy under which the sign-in page runs without complaint", async ({ page }) => {
  const complaints: string[] = [];
  page.on("console", (message) => {
    if (message.type() === "error") complaints.push(message.text());
  });
  page.on("pageerror", (error) => complaints.push(error.message));
  const response = await page.goto("/sign-in");
  expect(response?.headers()["content-security-policy"]).toMatch(/script-src 'self' 'nonce-[^']+' 'strict-dynamic'/);
  expect(response?.headers()["x-content-type-options"]).toBe("nosniff");
  await page.getByLabel("E-mail address").fill(emailOf("engineer"));
  await page.getByLabel("Password").fill(demonstrationPassword);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL((url) => url.pathname === "/parts");
  expect(complaints).toEqual([]);
});
