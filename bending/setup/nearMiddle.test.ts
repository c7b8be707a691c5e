import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Layout } from "./layout";
import { nearMiddle, type StationLoad } from "./nearMiddle";

const run = (length: number) => ({ pieces: [], gap: 0, length });
const layoutOf = (places: readonly (readonly [z: number, length: number])[]): Layout => ({ setupSeconds: 0, stations: places.map(([z, length]) => ({ pair: 0, punch: run(length), die: run(length), z })) });
const BED = 2000;
/** The most that any load is out of its reach. */
const out = ({ stations }: Layout, loads: readonly StationLoad[]) => Math.max(0, ...loads.map(({ station, offset, reach }) => Math.abs((stations[station]?.z ?? 0) + offset) - reach));

describe("nearMiddle", () => {
  it("leaves what need not move", () => {
    const layout = layoutOf([[-300, 200], [300, 200]]);
    expect(nearMiddle(layout, [], BED)).toBe(layout);
    expect(nearMiddle(layout, [{ station: 0, offset: 0, reach: 300 }, { station: 1, offset: 0, reach: Infinity }], BED)).toBe(layout);
  });

  it("moves as little as brings a load within its reach, and no farther than the bed goes", () => {
    const layout = layoutOf([[-300, 200], [300, 200]]);
    expect(nearMiddle(layout, [{ station: 0, offset: -20, reach: 120 }], BED).stations.map(({ z }) => z)).toEqual([-100, 500]);
    expect(nearMiddle(layout, [{ station: 0, offset: 0, reach: 50 }], 900).stations.map(({ z }) => z)).toEqual([-250, 350]);
  });

  it("is as good as any place along the bed", () => {
    const loads = fc.array(fc.record({ station: fc.integer({ min: 0, max: 1 }), offset: fc.integer({ min: -20, max: 20 }), reach: fc.integer({ min: 0, max: 600 }) }), { minLength: 1, maxLength: 3 });
    fc.assert(fc.property(loads, fc.integer({ min: -500, max: 0 }), fc.integer({ min: 200, max: 500 }), (asked, left, right) => {
      const layout = layoutOf([[left, 100], [right, 200]]);
      const best = out(nearMiddle(layout, asked, BED), asked);
      for (let by = Math.ceil(-950 - left); by <= 900 - right; by += 23) expect(best).toBeLessThanOrEqual(out({ ...layout, stations: layout.stations.map((station) => ({ ...station, z: station.z + by })) }, asked) + 1e-9);
    }));
  });
});
