import { beforeAll, expect, it } from "vitest";
import { bracketDocument } from "@/tests/integration/shop/bracketDocument";
import { bracketRevision } from "@/tests/integration/shop/bracketRevision";
import { bracketShop } from "@/tests/integration/shop/bracketShop";
import { openDatabase } from "@/tests/integration/openDatabase";
import { deletePart } from "./deletePart";
import { findPart } from "./findPart";
import { findParts, type PartSort } from "./findParts";
import { insertPart } from "./insertPart";
import { insertRevision } from "./insertRevision";

const database = openDatabase();
beforeAll(() => bracketShop(database()));

const list = (changes: { q?: string; sort?: PartSort; dir?: "asc" | "desc"; page?: number; pageSize?: number; material?: string }) =>
  findParts(database(), { sort: "number", dir: "asc", page: 1, pageSize: 25, ...changes });

it("gives back the document that was put in, whatever its name holds", async () => {
  const name = `<b>Łódź</b> 100% "quoted" \\ 'single'`;
  const { partId } = await insertPart(database(), "R-1", bracketRevision({ name, document: { ...bracketDocument, name } }));
  const found = await findPart(database(), partId);
  expect(found?.revision).toMatchObject({ name, revision: 1, document: { ...bracketDocument, name } });
  await deletePart(database(), partId);
});

it("makes up numbers that no part has", async () => {
  await insertPart(database(), "P-1002", bracketRevision());
  const made = [];
  for (let i = 0; i < 3; i++) made.push(await insertPart(database(), undefined, bracketRevision()));
  expect(made.map(({ number }) => number)).toEqual(["P-1001", "P-1003", "P-1004"]);
  const { rows } = await list({});
  for (const { id } of rows) expect(await deletePart(database(), id)).toBe(true);
  expect((await list({})).total).toBe(0);
});

it("lets one of two revisions of the same base through", async () => {
  const { partId } = await insertPart(database(), "S-1", bracketRevision());
  const both = await Promise.all(["one", "two"].map((note) => insertRevision(database(), partId, 1, bracketRevision({ note }))));
  expect(both.map(({ kind }) => kind).sort()).toEqual(["inserted", "stale"]);
  expect(both.find(({ kind }) => kind === "stale")).toEqual({ kind: "stale", latest: 2 });
  const found = await findPart(database(), partId);
  expect(found?.revisions.map(({ revision }) => revision)).toEqual([2, 1]);
  expect((await findPart(database(), partId, 1))?.revision.revision).toBe(1);
  expect(await findPart(database(), partId, 3)).toBeUndefined();
  expect(await insertRevision(database(), "00000000-0000-4000-8000-000000000000", 1, bracketRevision())).toEqual({ kind: "no-part" });
  await deletePart(database(), partId);
});

it("keeps nothing of a revision that is refused", async () => {
  const { partId } = await insertPart(database(), "T-1", bracketRevision());
  await expect(insertRevision(database(), partId, 1, bracketRevision({ materialId: "cheese" }))).rejects.toThrow();
  expect((await findPart(database(), partId))?.part.latest_revision).toBe(1);
  await deletePart(database(), partId);
});

it("searches, sorts and pages by the newest revision", async () => {
  for (const [number, name, thickness] of [["L-1", "Rail 50%", 1], ["L-2", "Rail 505", 3], ["L-3", "Tray", 2]] as const) {
    await insertPart(database(), number, bracketRevision({ name, thicknessMm: thickness, materialId: thickness === 2 ? "DC01" : "S235" }));
  }
  expect((await list({ q: "rail" })).rows.map(({ number }) => number)).toEqual(["L-1", "L-2"]);
  expect((await list({ q: "50%" })).rows.map(({ number }) => number)).toEqual(["L-1"]);
  expect((await list({ q: "_-1" })).total).toBe(0);
  expect((await list({ material: "DC01" })).rows.map(({ number }) => number)).toEqual(["L-3"]);
  expect((await list({ sort: "thickness", dir: "desc" })).rows.map(({ thickness_mm }) => thickness_mm)).toEqual([3, 2, 1]);
  const second = await list({ page: 2, pageSize: 2 });
  expect([second.total, second.rows.map(({ number }) => number)]).toEqual([3, ["L-3"]]);
});
