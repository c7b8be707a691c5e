import { describe, expect, it } from "vitest";
import { GET as partList, POST as createPart } from "@/app/api/parts/route";
import { POST as startPlan } from "@/app/api/plans/route";
import { PATCH as updatePiece } from "@/app/api/pieces/[id]/route";
import { POST as addPieces } from "@/app/api/tools/[code]/pieces/route";
import { PATCH as updateTool } from "@/app/api/tools/[code]/route";
import { GET as toolList, POST as createTool } from "@/app/api/tools/route";
import { bracketCaller } from "./shop/bracketCaller";
import { bracketDocument } from "./shop/bracketDocument";

const { call, rows, machineId, gate } = bracketCaller();
const nobody = "00000000-0000-4000-8000-000000000000";
const part = (changes: object) => ({ document: { ...bracketDocument, ...changes } });
const profile = (changes: object) => part({ profile: { ...bracketDocument.profile, ...changes } });
const punch = (changes: object) => ({
  code: "N-1", kind: "punch", profile: [[0, 0], [8, 8.3], [8, 100], [-8, 100], [-8, 8.3]], tipAngle: 88, tipRadius: 0.8, height: 100, maxForcePerMetre: 800,
  tang: "20 mm", ...changes,
});

describe("a part that cannot be made is refused, the field is named, and no row is written", () => {
  it.each<[string, object, string, RegExp]>([
    ["no document", {}, "document", /./],
    ["thickness 0", part({ thickness: 0 }), "document.thickness", /0/],
    ["thickness as text", part({ thickness: "2" }), "document.thickness", /number/],
    ["an unknown material", part({ material: "cheese" }), "document.material", /cheese/],
    ["an angle of 0", profile({ bends: [{ angle: 0, direction: "up" }] }), "document.profile.bends[0].angle", /0/],
    ["an angle over 180", profile({ bends: [{ angle: 181, direction: "up" }] }), "document.profile.bends[0].angle", /180/],
    ["a leg shorter than its setback", profile({ legs: [3, 60] }), "document.profile.legs[0]", /./],
    ["a key that is not known", part({ colour: "red" }), "document.colour", /./],
    ["a NUL in the name", part({ name: "a\u0000b" }), "document.name", /control characters/],
    ["half a character in the name", part({ name: "a\ud800b" }), "document.name", /control characters/],
    ["a name of a kilometre", part({ name: "x".repeat(5000) }), "document.name", /at most|or fewer|longer/],
    ["a note of a kilometre", { ...part({}), note: "x".repeat(2001) }, "note", /2000 characters/],
    ["an empty number", { ...part({}), number: " " }, "number", /empty/],
  ])("%s", async (_what, body, path, words) => {
    const before = await rows();
    const answer = await call("engineer", createPart, "/api/parts", { body });
    expect(answer.status).toBe(422);
    const named = answer.body.errors?.find((error) => error.path === path);
    expect(named, JSON.stringify(answer.body)).toBeDefined();
    expect(named?.message).toMatch(words);
    expect(answer.body.detail).toContain("Nothing was saved");
    expect(await rows()).toBe(before);
  });

  it("a crossing outline", async () => {
    const before = await rows();
    const document = { ...bracketDocument, profile: undefined, base: { outline: [[0, 0], [100, 100], [100, 0], [0, 100]] }, flanges: [] };
    const answer = await call("engineer", createPart, "/api/parts", { body: { document } });
    expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([422, "document.base.outline"]);
    expect(answer.body.errors?.[0]?.message).toMatch(/cross/i);
    expect(await rows()).toBe(before);
  });

  it("a document of 10 MB", async () => {
    const before = await rows();
    const answer = await call("engineer", createPart, "/api/parts", { raw: JSON.stringify(part({ name: "x".repeat(10_000_000) })) });
    expect(answer.status).toBe(413);
    expect(answer.body.detail).toContain("larger than 2 MB");
    expect(await rows()).toBe(before);
  });

  it("a nest a thousand deep", async () => {
    const before = await rows();
    const answer = await call("engineer", createPart, "/api/parts", { raw: `{"document":${"[".repeat(1000)}${"]".repeat(1000)}}` });
    expect([answer.status, answer.body.errors?.[0]?.message]).toEqual([422, "is nested deeper than 40 levels"]);
    expect(await rows()).toBe(before);
  });
});

it("HTML in a name is text like any other", async () => {
  const name = `<img src=x onerror="alert(1)"> & <b>rail</b>`;
  const answer = await call("engineer", createPart, "/api/parts", { body: { ...part({ name }), number: "<i>7</i>", note: "<script>" } });
  expect(answer.status).toBe(201);
  expect(answer.body).toMatchObject({ name, number: "<i>7</i>", revision: { note: "<script>", revision: 1 } });
  const found = await call("engineer", partList, `/api/parts?q=${encodeURIComponent("<b>rail")}`);
  expect(found.body["items"]).toMatchObject([{ name }]);
});

it("a number that is taken is refused", async () => {
  await call("engineer", createPart, "/api/parts", { body: { ...part({}), number: "N-1" } });
  const before = await rows();
  const answer = await call("engineer", createPart, "/api/parts", { body: { ...part({}), number: "N-1" } });
  expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([409, "number"]);
  expect(await rows()).toBe(before);
});

describe("a tool that cannot be used is refused, the field is named, and no row is written", () => {
  it.each<[string, object, string, RegExp]>([
    ["a profile that crosses itself", punch({ profile: [[0, 0], [8, 100], [-8, 100], [8, 8.3], [-8, 8.3]] }), "profile", /cross/i],
    ["no profile", punch({ profile: undefined }), "profile", /missing/],
    ["a height of 0", punch({ height: 0 }), "height", /over 0/],
    ["a value of the other kind", punch({ vOpening: 16 }), "vOpening", /./],
    ["an empty code", punch({ code: "" }), "code", /empty/],
    ["a code with markup", punch({ code: "<b>" }), "code", /letter or digit/],
    ["a piece of length 0", punch({ pieces: [{ length: 0 }] }), "pieces[0].length", /more than 0/],
    ["an unknown horn", punch({ pieces: [{ length: 100, horn: "up" }] }), "pieces[0].horn", /left, right, both/],
  ])("%s", async (_what, body, path, words) => {
    const before = await rows();
    const answer = await call("toolroom", createTool, "/api/tools", { body });
    expect(answer.status).toBe(422);
    const named = answer.body.errors?.find((error) => error.path === path);
    expect(named, JSON.stringify(answer.body)).toBeDefined();
    expect(named?.message).toMatch(words);
    expect(await rows()).toBe(before);
  });

  it("a code or a mark that is taken", async () => {
    const before = await rows();
    const code = await call("toolroom", createTool, "/api/tools", { body: punch({ code: "P-1" }) });
    expect([code.status, code.body.errors?.[0]?.path]).toEqual([409, "code"]);
    const mark = await call("toolroom", createTool, "/api/tools", { body: punch({ pieces: [{ length: 100, code: "P-1-200-1" }] }) });
    expect([mark.status, mark.body.detail]).toEqual([409, expect.stringContaining("P-1-200-1")]);
    const added = await call("toolroom", addPieces, "/api/tools/V-16/pieces", { params: { code: "V-16" }, body: { pieces: [{ length: 50 }, { length: 100, code: "P-1-200-1" }] } });
    expect(added.status).toBe(409);
    expect(await rows()).toBe(before);
  });

  it("a change that makes the profile cross itself", async () => {
    const answer = await call("toolroom", updateTool, "/api/tools/P-1", { params: { code: "P-1" }, body: { profile: [[0, 0], [8, 100], [-8, 100], [8, 8.3], [-8, 8.3]] } });
    expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([422, "profile"]);
  });

  it("a piece at no brake, or at one that is not there", async () => {
    const params = { id: nobody };
    const nowhere = await call("toolroom", updatePiece, `/api/pieces/${nobody}`, { params, body: { state: "at brake" } });
    expect([nowhere.status, nowhere.body.errors?.[0]?.path]).toEqual([422, "machineId"]);
    const unknown = await call("toolroom", updatePiece, `/api/pieces/${nobody}`, { params, body: { state: "at brake", machineId: nobody } });
    expect([unknown.status, unknown.body.errors?.[0]?.path]).toEqual([422, "machineId"]);
    const missing = await call("toolroom", updatePiece, `/api/pieces/${nobody}`, { params, body: { state: "withdrawn" } });
    expect(missing.status).toBe(404);
  });
});

describe("a plan that cannot be asked for is refused", () => {
  it.each<[string, object, string]>([
    ["of no part", { partId: nobody }, "partId"],
    ["of something that is no id", { partId: "7" }, "partId"],
    ["for a batch of 0", { batch: 0 }, "batch"],
    ["for half a part", { batch: 1.5 }, "batch"],
  ])("%s", async (_what, changes, path) => {
    const body = { partId: nobody, machineId: machineId(), batch: 1, ...changes };
    const answer = await call("engineer", startPlan, "/api/plans", { body });
    expect([answer.status, answer.body.errors?.map((error) => error.path)]).toEqual([422, [path]]);
  });
});

it("lists refuse what they cannot do", async () => {
  for (const query of ["sort=price", "page=0", "pageSize=1000", "dir=up"]) {
    expect((await call("engineer", partList, `/api/parts?${query}`)).status).toBe(400);
  }
  expect((await call("operator", toolList, "/api/tools?q=%00")).status).toBe(400);
  expect((await call("engineer", partList, "/api/parts?q=%25%5F%5C'%22")).status).toBe(200);
});

it("a database that is lost is said, and nothing is half written", async () => {
  const before = await rows();
  await gate().shut();
  const answer = await call("engineer", createPart, "/api/parts", { body: part({ name: "Lost" }) });
  expect([answer.status, answer.body.detail]).toEqual([503, expect.stringContaining("database cannot be reached")]);
  await gate().reopen();
  expect(await rows()).toBe(before);
});
