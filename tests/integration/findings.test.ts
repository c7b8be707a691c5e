import { beforeAll, describe, expect, it } from "vitest";
import { GET as findingCounts } from "@/app/api/finding-counts/route";
import { POST as createPart } from "@/app/api/parts/route";
import { GET as shopLimits } from "@/app/api/shop-limits/route";
import { POST as addRevision } from "@/app/api/parts/[id]/revisions/route";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import { database } from "@/db/client";
import type { FindingCountsView } from "@/lib/schemas/findingCounts";
import type { PartDetail } from "@/lib/schemas/views";
import { bracketCaller } from "./shop/bracketCaller";

const { call } = bracketCaller();
const angle = (leg: number) => ({ format: "part/1", name: "Angle", units: "mm", material: "DC01", thickness: 2, insideRadius: 2.5, profile: { width: 100, legs: [60, leg], bends: [{ angle: 90, direction: "up" }] } });
const counts = async (ids: readonly string[]) => (await call("engineer", findingCounts, `/api/finding-counts?ids=${ids.join(",")}`)).body as unknown as FindingCountsView;
const limits = async () => (await call("engineer", shopLimits, "/api/shop-limits")).body as unknown as ShopLimits;

const pieces = (code: string) => database()("tool_pieces").whereIn("tool_id", database()("tools").where({ code }).select("id"));

let part: PartDetail;
beforeAll(async () => {
  part = (await call("engineer", createPart, "/api/parts", { body: { document: angle(7) } })).body as unknown as PartDetail;
});

describe("what the shop can do", () => {
  it("is told from the brake and the tools in service", async () => {
    const shop = await limits();
    expect(shop.machines).toHaveLength(1);
    expect([shop.dies, shop.punches].map((tools) => tools.length)).toEqual([1, 1]);
    expect(shop.dies[0]).toMatchObject({ vOpening: 16, vAngle: expect.closeTo(86, 6) });
    expect(shop.stock.length).toBeGreaterThan(0);
  });
});

describe("findings in a list", () => {
  it("are counted for the newest revision", async () => {
    expect(await counts([part.id])).toEqual({ [part.id]: { stop: 1, caution: 0, note: 0 } });
    await call("engineer", addRevision, `/api/parts/${part.id}/revisions`, { params: { id: part.id }, body: { basedOn: 1, document: angle(30) } });
    expect(await counts([part.id])).toEqual({ [part.id]: { stop: 0, caution: 0, note: 0 } });
  });

  it("follow the shop: with its die withdrawn nothing can be bent", async () => {
    const { id } = (await call("engineer", createPart, "/api/parts", { body: { document: angle(30) } })).body as unknown as PartDetail;
    expect((await counts([id]))[id]?.stop).toBe(0);
    const [die] = (await limits()).dies;
    await pieces(die?.id ?? "").update({ state: "withdrawn" });
    expect((await counts([id]))[id]?.stop).toBe(1);
    await pieces(die?.id ?? "").update({ state: "in rack" });
    expect((await counts([id]))[id]?.stop).toBe(0);
  });

  it("leave out what there is not, and refuse what is no id", async () => {
    expect(await counts(["00000000-0000-4000-8000-000000000000"])).toEqual({});
    const refused = await call("engineer", findingCounts, "/api/finding-counts?ids=door");
    expect(refused.status).toBe(400);
  });
});
