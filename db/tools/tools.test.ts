import { beforeAll, expect, it } from "vitest";
import { mm } from "@/bending/core/units";
import { bracketDie, bracketPunch } from "@/tests/integration/shop/bracketTools";
import { bracketShop } from "@/tests/integration/shop/bracketShop";
import { openDatabase } from "@/tests/integration/openDatabase";
import { findPieces } from "./findPieces";
import { findTool } from "./findTool";
import { findTools, type ToolSort } from "./findTools";
import { findToolsInService } from "./findToolsInService";
import { insertTool } from "./insertTool";
import { toolFromRow } from "./toolFromRow";
import { updatePiece } from "./updatePiece";

const database = openDatabase();
let machineId: string;
beforeAll(async () => {
  machineId = await bracketShop(database());
});

const pieceId = async (code: string) => (await findPieces(database(), { toolCodes: ["P-1", "V-16"] })).find((piece) => piece.code === code)?.id ?? "";

it("gives back the tools that were put in", async () => {
  const tools = await findToolsInService(database());
  expect(tools.map(({ id }) => id)).toEqual(["P-1", "V-16"]);
  const [punch, die] = tools;
  if (punch?.kind !== "punch" || die?.kind !== "die") throw new Error("punch, then die");
  expect(punch).toEqual({ ...bracketPunch, tipAngle: punch.tipAngle });
  expect(punch.tipAngle).toBeCloseTo(bracketPunch.tipAngle, 12);
  expect(die).toEqual({ ...bracketDie, vAngle: die.vAngle });
});

it("keeps the slot of a hem die, and refuses one on a punch", async () => {
  const flattening = { floor: mm(30), back: mm(4), opening: mm(12) };
  await database().transaction(async (within) => {
    await insertTool(within, { ...bracketDie, id: "H-16", flattening }, []);
    const row = await findTool(within, "H-16");
    expect(row && toolFromRow(row, [])).toMatchObject({ id: "H-16", flattening });
    await within("tools").where({ code: "H-16" }).delete();
  });
  await expect(database()("tools").where({ code: "P-1" }).update({ flattening: JSON.stringify(flattening) })).rejects.toThrow("tools_flattening_of_dies");
});

it("counts on pieces in the rack and at a brake alone", async () => {
  await updatePiece(database(), await pieceId("P-1-200-1"), { state: "at regrind" });
  await updatePiece(database(), await pieceId("V-16-200-1"), { state: "withdrawn" });
  const tools = await findToolsInService(database());
  expect(tools.map(({ id, pieces }) => [id, pieces.map((piece) => piece.id)])).toEqual([["P-1", ["P-1-100-1"]]]);
  expect(await findTool(database(), "P-1")).toMatchObject({ pieces: 2, pieces_in_service: 1, length_in_service_mm: 100 });
  await updatePiece(database(), await pieceId("P-1-200-1"), { state: "at brake", machineId });
  await updatePiece(database(), await pieceId("V-16-200-1"), { state: "in rack" });
  expect(await findTool(database(), "P-1")).toMatchObject({ pieces_in_service: 2, length_in_service_mm: 300 });
});

it("keeps no tool whose pieces are refused", async () => {
  await expect(insertTool(database(), { ...bracketPunch, id: "P-2" })).rejects.toThrow("tool_pieces_code_key");
  expect(await findTool(database(), "P-2")).toBeUndefined();
});

it("sorts by every column that it names", async () => {
  const columns: readonly ToolSort[] = ["code", "name", "kind", "angle", "radius", "vOpening", "height", "maxForce", "pieces", "lengthInService"];
  for (const sort of columns) {
    const { rows, total } = await findTools(database(), { sort, dir: "desc", page: 1, pageSize: 25 });
    expect([sort, rows.length, total]).toEqual([sort, 2, 2]);
  }
  expect((await findTools(database(), { sort: "pieces", dir: "desc", page: 1, pageSize: 25 })).rows.map(({ code }) => code)).toEqual(["P-1", "V-16"]);
  expect((await findTools(database(), { sort: "code", dir: "asc", page: 1, pageSize: 25, kind: "die", q: "v-" })).rows.map(({ code }) => code)).toEqual(["V-16"]);
});
