import { beforeAll, describe, expect, it } from "vitest";
import { bracketRevision } from "@/tests/integration/shop/bracketRevision";
import { bracketShop } from "@/tests/integration/shop/bracketShop";
import { openDatabase } from "@/tests/integration/openDatabase";
import { insertPart } from "./parts/insertPart";

const database = openDatabase();
let machineId: string;
beforeAll(async () => {
  machineId = await bracketShop(database());
});

const refused = async (work: Promise<unknown>): Promise<string> => {
  const thrown: unknown = await work.then(() => null, (error: unknown) => error);
  return thrown instanceof Error && "code" in thrown && "constraint" in thrown ? `${String(thrown.code)} ${String(thrown.constraint)}` : `not refused: ${String(thrown)}`;
};
const punch = () => database()("tools").where({ code: "P-1" });
const piece = () => database()("tool_pieces").where({ code: "P-1-200-1" });

describe("tools", () => {
  it("have a code of their own", async () => {
    const [row] = await punch().select("kind", "name", "angle_deg", "tip_radius_mm", "height_mm", "max_force_kn_per_m", "tang");
    expect(await refused(database()("tools").insert({ ...row, profile: "[[0,0],[1,1],[0,1]]", code: "P-1" }))).toBe("23505 tools_code_key");
  });

  it("are punch or die, each with its own values", async () => {
    expect(await refused(punch().update({ kind: "hammer" }))).toMatch(/^23514/);
    expect(await refused(punch().update({ v_opening_mm: 16 }))).toBe("23514 tools_kind_has_its_values");
    expect(await refused(database()("tools").where({ code: "V-16" }).update({ shoulder_radius_mm: null }))).toBe("23514 tools_kind_has_its_values");
  });

  it("have a height and a rating over 0", async () => {
    expect(await refused(punch().update({ height_mm: 0 }))).toBe("23514 tools_height_mm_check");
    expect(await refused(punch().update({ max_force_kn_per_m: -1 }))).toBe("23514 tools_max_force_kn_per_m_check");
  });

  it("stay while a piece of them is there", async () => {
    expect(await refused(punch().delete())).toBe("23503 tool_pieces_tool_id_fkey");
  });
});

describe("pieces", () => {
  it("have a length, a known horn and a known state", async () => {
    expect(await refused(piece().update({ length_mm: 0 }))).toBe("23514 tool_pieces_length_mm_check");
    expect(await refused(piece().update({ horn: "up" }))).toBe("23514 tool_pieces_horn_check");
    expect(await refused(piece().update({ state: "lost" }))).toMatch(/^23514/);
  });

  it("are at a brake exactly when they say so", async () => {
    expect(await refused(piece().update({ state: "at brake" }))).toBe("23514 tool_pieces_at_a_brake");
    expect(await refused(piece().update({ machine_id: machineId }))).toBe("23514 tool_pieces_at_a_brake");
    expect(await piece().update({ state: "at brake", machine_id: machineId })).toBe(1);
    expect(await refused(database()("machines").where({ id: machineId }).delete())).toBe("23503 tool_pieces_machine_id_fkey");
  });

  it("have a mark of their own", async () => {
    expect(await refused(piece().update({ code: "V-16-200-1" }))).toBe("23505 tool_pieces_code_key");
  });
});

describe("parts", () => {
  it("are never without the revision that they name as their newest", async () => {
    expect(await refused(database()("parts").insert({ number: "bare", latest_revision: 1 }))).toBe("23503 parts_latest_revision_exists");
    expect(await database()("parts").where({ number: "bare" })).toEqual([]);
  });

  it("have a number of their own and revisions of a known material and a thickness over 0", async () => {
    await insertPart(database(), "A-1", bracketRevision());
    expect(await refused(insertPart(database(), "A-1", bracketRevision()))).toBe("23505 parts_number_key");
    expect(await refused(insertPart(database(), "A-2", bracketRevision({ materialId: "cheese" })))).toBe("23503 part_revisions_material_id_fkey");
    expect(await refused(insertPart(database(), "A-2", bracketRevision({ thicknessMm: 0 })))).toBe("23514 part_revisions_thickness_mm_check");
    expect(await database()("parts").where({ number: "A-2" })).toEqual([]);
  });
});
