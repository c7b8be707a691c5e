import fc from "fast-check";
import { expect, test } from "vitest";
import { applyCure } from "@/bending/findings/applyCure";
import { findingsOf } from "@/bending/findings/findingsOf";
import { trialShop } from "@/bending/findings/trial/trialShop";
import { materialById } from "@/bending/handbook/materials";
import { buildPart } from "@/bending/part/buildPart";
import { documentInUnits } from "@/bending/part/documentInUnits";
import type { FlangeEntry, PartDocument } from "@/bending/part/partDocument";
import { arbitraryProfile, arbitraryTray } from "./arbitraryPart";

const build = (document: PartDocument) => {
  const built = buildPart(document, { materials: materialById });
  return built.ok ? built.value : null;
};

const coordinate = fc.integer({ min: 2, max: 98 });
const more = fc.record({
  units: fc.constantFrom("mm" as const, "in" as const),
  grain: fc.option(fc.constantFrom("x" as const, "y" as const, 30), { nil: undefined }),
  holes: fc.array(fc.tuple(coordinate, coordinate, fc.integer({ min: 2, max: 14 })), { maxLength: 3 }),
  flangeHole: fc.option(fc.tuple(fc.integer({ min: 5, max: 60 }), fc.integer({ min: 5, max: 14 }), fc.integer({ min: 2, max: 5 })), { nil: null }),
  shorten: fc.constantFrom(0, 8, 12),
  narrow: fc.option(fc.constantFrom(0.3, 1), { nil: null }),
  hem: fc.boolean(),
  shop: fc.boolean(),
});

/** Random parts with short flanges, holes near bends, narrow reliefs, hems: much for the rules to find. */
const arbitraryTroubled = fc.tuple(fc.oneof(arbitraryProfile, arbitraryTray), more).map(([document, extra]): { document: PartDocument; shop: typeof trialShop | null } => {
  const shared = { ...(extra.grain === undefined ? {} : { grain: extra.grain }) };
  const shop = extra.shop ? trialShop : null;
  if (!document.base) return { document: documentInUnits({ ...document, ...shared }, extra.units), shop };
  const [, [width], [, depth]] = document.base.outline as unknown as readonly [unknown, readonly [number], readonly [number, number]];
  const holes = extra.holes.map(([x, y, diameter]) => ({ circle: [(width * x) / 100, (depth * y) / 100] as const, diameter }));
  const flanges = (document.flanges ?? []).map((flange, i): FlangeEntry => ({
    ...flange,
    length: Math.max(flange.length ?? 0, 15) - (flange.on === "base" && i % 2 === 0 ? extra.shorten : 0),
    ...(extra.flangeHole && i === 0 ? { holes: [{ circle: [extra.flangeHole[0], extra.flangeHole[1]], diameter: extra.flangeHole[2] }] } : {}),
    ...(extra.narrow !== null && i === 0 ? { relief: { kind: "rectangular", width: extra.narrow } } : {}),
    ...(extra.hem && flange.on !== "base" ? { angle: 180, hem: "closed", length: 7 } : {}),
  }));
  return { document: documentInUnits({ ...document, ...shared, base: { ...document.base, holes }, flanges }, extra.units), shop };
});

test("applying a cure clears the finding, in whatever unit the part is drawn", { timeout: 120_000 }, () => {
  const cured = new Map<string, number>();
  let [built, refused] = [0, 0];
  fc.assert(fc.property(arbitraryTroubled, ({ document, shop }) => {
    const part = build(document);
    if (!part) return;
    for (const finding of findingsOf({ part, document, shop }).list) {
      if (!finding.cure) continue;
      const changed = applyCure(document, finding.cure);
      const again = build(changed);
      // A longer radius can leave nothing of a leg, a longer flange run into another: the field then says so.
      if (!again) { refused += 1; continue; }
      built += 1;
      cured.set(finding.rule, (cured.get(finding.rule) ?? 0) + 1);
      const left = findingsOf({ part: again, document: changed, shop }).list.filter(({ key }) => key === finding.key);
      expect(left, `${finding.cure.path} = ${finding.cure.says}`).toEqual([]);
    }
  }), { numRuns: 40, seed: 20 });
  expect([...cured.keys()].sort()).toEqual(expect.arrayContaining(["angle", "flange", "hem-return", "hole", "narrow-v", "radius", "relief", "relief-width"]));
  expect(refused / (refused + built)).toBeLessThan(0.1);
});

test("a part is judged alike in millimetres and in inches", { timeout: 120_000 }, () => {
  fc.assert(fc.property(arbitraryTroubled, ({ document, shop }) => {
    const judged = (["mm", "in"] as const).map((units) => {
      const said = documentInUnits(document, units);
      const part = build(said);
      return part && findingsOf({ part, document: said, shop }).list.map(({ key, severity, bends, faces }) => ({ key, severity, bends, faces }));
    });
    expect(judged[1]).toEqual(judged[0]);
  }), { numRuns: 25, seed: 3 });
});
