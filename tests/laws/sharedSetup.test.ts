import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { kiloNewtonPerMetre, mm, rad } from "@/bending/core/units";
import type { Interval } from "@/bending/geometry/interval";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";
import { freeShifts } from "@/bending/setup/freeShifts";
import { everySharedBed } from "./everySharedBed";
import { sharedSetup, type SharedSetup } from "@/bending/setup/shared/sharedSetup";
import type { SharedWay, SharedWish } from "@/bending/setup/shared/sharedWish";

const tool = (kind: "punch" | "die", id: string, lengths: readonly number[], height = 100): Tool => {
  const common = {
    id, name: id, profile: [[0, 0], [5, 10], [-5, 10]] as const, height: mm(height), maxForcePerMetre: kiloNewtonPerMetre(1000), tang: "20 mm",
    pieces: [...lengths].sort((a, b) => b - a).map((length, index) => ({ id: `${id}-${index}`, length: mm(length), horn: null, rack: null })),
  };
  return kind === "punch" ? { ...common, kind, tipAngle: rad(1.5), tipRadius: mm(1) } : { ...common, kind, vOpening: mm(8), vAngle: rad(1.5), shoulderRadius: mm(1) };
};

const machine = (bedLength: number, maxSectionGap: number, maxUncoveredEnd: number): Machine => ({
  name: "brake", bedLength: mm(bedLength), betweenFrames: mm(bedLength), maxForce: 1000 as Machine["maxForce"], daylight: mm(500), stroke: mm(200), throatDepth: mm(400),
  punchTang: "20 mm", dieTang: "20 mm", ramProfile: [], bedProfile: [],
  gauge: { fingers: 2, independent: true, x: [mm(0), mm(500)], r: [mm(0), mm(100)], z: [mm(-500), mm(500)], minSpread: mm(50), fingerProfile: [], fingerWidth: mm(30) },
  settings: { clearance: mm(1), maxSectionGap: mm(maxSectionGap), maxUncoveredEnd: mm(maxUncoveredEnd), angleRepeat: rad(0), gaugeRepeat: mm(0) },
  times: { flip: 1, turn: 1, walkPerMetre: 1, stroke: 1, gaugeMove: 1, stationSetup: 1, sectionPlace: 1 },
});

const beside = fc.constantFrom(0, 1, 4, 10, 30, 500);
const lengths = fc.array(fc.constantFrom(10, 20, 30, 50, 60), { minLength: 1, maxLength: 3 });
const window = (half: number): fc.Arbitrary<Interval> => fc.tuple(beside, beside).map(([left, right]) => [-half - left, half + right]);
const ways = (half: number, pairs: readonly (readonly [string, string])[]): fc.Arbitrary<readonly SharedWay[]> =>
  fc.subarray([...pairs], { minLength: 1 }).chain((chosen) => fc.tuple(...chosen.map(([punch, die]) => fc.tuple(window(half), window(half)).map(([punchWindow, dieWindow]) => ({ punch, die, punchWindow, dieWindow })))));
const wishOf = (index: number, pairs: readonly (readonly [string, string])[]): fc.Arbitrary<SharedWish> =>
  fc.constantFrom(10, 20, 30, 40, 50, 80).chain((lineLength) => ways(lineLength / 2, pairs).map((found) => ({ id: `w${index}`, lineLength, sheet: [-lineLength / 2, lineLength / 2] as const, forceKN: lineLength, ways: found })));

const cases = fc.record({ p: lengths, q: lengths, v: lengths, w: lengths, twoPairs: fc.boolean(), count: fc.integer({ min: 1, max: 3 }), bed: fc.constantFrom(150, 250, 400, 1500), gap: fc.constantFrom(0, 3), end: fc.constantFrom(0, 4) })
  .chain(({ p, q, v, w, twoPairs, count, bed, gap, end }) => {
    const pairs = twoPairs ? [["p", "v"], ["q", "v"], ["q", "w"]] as const : [["p", "v"]] as const;
    const stock = [tool("punch", "p", p), tool("punch", "q", q), tool("die", "v", v), tool("die", "w", w)];
    return fc.tuple(...Array.from({ length: count }, (_, index) => wishOf(index, pairs))).map((wishes): { wishes: readonly SharedWish[]; stock: readonly Tool[]; brake: Machine } => ({ wishes, stock, brake: machine(bed, gap, end) }));
  });

/** The answer as one number to compare: stations, kinds, pieces, length; infinite when there is no bed. */
const rank = ({ status, stations, kinds, pieces, carried }: SharedSetup) => (status === "infeasible" ? Infinity : ((stations.length * 100 + kinds) * 100 + pieces) * 1e5 + carried);

/** What is wrong with an answer, said plainly: bends not held, pieces used twice, stations too near or off the bed. */
function wrongWith(setup: SharedSetup, wishes: readonly SharedWish[], { bedLength, settings }: Machine): readonly string[] {
  const wrong: string[] = [];
  const used = setup.stations.flatMap(({ punchRun, dieRun }) => [...punchRun.pieces, ...dieRun.pieces]);
  if (new Set(used).size !== used.length) wrong.push("a piece stands twice");
  const served = setup.stations.flatMap((station) => station.wishes.map((one) => ({ ...one, station })));
  if (served.length !== wishes.length) wrong.push("not every bend once");
  for (const { id, z, station } of served) {
    const wish = wishes.find((one) => one.id === id);
    const way = wish?.ways.find(({ punch, die }) => punch === station.punch && die === station.die);
    if (!wish || !way) { wrong.push(`${id} on the wrong tools`); continue; }
    const outside = ([from, to]: Interval): readonly Interval[] => [[-1e6, from], [to, 1e6]];
    const free = freeShifts(Math.min(station.punchRun.length, station.dieRun.length) / 2 - wish.lineLength / 2 + settings.maxUncoveredEnd + 1e-5, [
      { offset: 0, length: station.punchRun.length - 1e-5, forbidden: outside(way.punchWindow) }, { offset: 0, length: station.dieRun.length - 1e-5, forbidden: outside(way.dieWindow) },
    ]);
    if (!free.some(([from, to]) => z - station.z >= from - 1e-5 && z - station.z <= to + 1e-5)) wrong.push(`${id} is not held`);
    for (const other of setup.stations) {
      const half = Math.max(other.punchRun.length, other.dieRun.length) / 2;
      if (other !== station && other.z - half < z + wish.sheet[1] - 1e-6 && other.z + half > z + wish.sheet[0] + 1e-6) wrong.push(`${id}'s part lies over another station`);
    }
  }
  setup.stations.forEach(({ z, punchRun, dieRun }, index) => {
    const half = Math.max(punchRun.length, dieRun.length) / 2;
    const next = setup.stations[index + 1];
    if (Math.abs(z) + half > bedLength / 2 + 1e-6) wrong.push("off the bed");
    if (next && next.z - Math.max(next.punchRun.length, next.dieRun.length) / 2 - z - half < 100 - 1e-6) wrong.push("too near for a hand");
    for (const { pieces, gap, length } of [punchRun, dieRun]) {
      if (gap > settings.maxSectionGap + 1e-6 || Math.abs(pieces.reduce((sum, piece) => sum + piece.length, 0) + gap * (pieces.length - 1) - length) > 1e-6) wrong.push("a run does not add up");
    }
  });
  return wrong;
}

describe("sharedSetup", () => {
  it("has the same optimum as trying everything", () => {
    fc.assert(fc.property(cases, ({ wishes, stock, brake }) => {
      const answer = sharedSetup(wishes, stock, brake);
      expect(["optimal", "infeasible"]).toContain(answer.status);
      expect(wrongWith(answer.status === "optimal" ? answer : { ...answer, stations: [] }, answer.status === "optimal" ? wishes : [], brake)).toEqual([]);
      expect(rank(answer)).toBeCloseTo(everySharedBed(wishes, stock, brake), 3);
      if (answer.status === "infeasible") expect(answer.reasons.length).toBeGreaterThan(0);
    }), { numRuns: 250 });
  });

  it("is never better for one bend more, never worse for one piece more, and does not hang on names or on the order given", () => {
    fc.assert(fc.property(cases, fc.constantFrom(10, 25, 70), ({ wishes, stock, brake }, extra) => {
      const answer = rank(sharedSetup(wishes, stock, brake));
      expect(rank(sharedSetup(wishes.slice(1), stock, brake))).toBeLessThanOrEqual(answer);
      const more = stock.map((one) => (one.id === "p" ? { ...one, pieces: [...one.pieces, { id: "extra", length: mm(extra), horn: null, rack: null }] } : one));
      expect(rank(sharedSetup(wishes, more, brake))).toBeLessThanOrEqual(answer);
      const renamed = [...wishes].reverse().map((wish) => ({ ...wish, id: `x-${wish.id}`, ways: wish.ways.map((way) => ({ ...way, punch: `z${way.punch}`, die: `a${way.die}` })) }));
      expect(rank(sharedSetup(renamed, [...stock].reverse().map((one) => ({ ...one, id: `${one.kind === "punch" ? "z" : "a"}${one.id}` })), brake))).toBe(answer);
    }), { numRuns: 100 });
  });

  it("says no more than it knows when it is cut short", () => {
    fc.assert(fc.property(cases, fc.integer({ min: 1, max: 60 }), ({ wishes, stock, brake }, steps) => {
      const [whole, cut] = [sharedSetup(wishes, stock, brake), sharedSetup(wishes, stock, brake, { steps })];
      if (cut.status === "optimal" || cut.status === "infeasible") expect([cut.status, rank(cut)]).toEqual([whole.status, rank(whole)]);
      if (cut.status === "feasible") expect(rank(cut)).toBeGreaterThanOrEqual(rank(whole));
      if (whole.status === "optimal") expect(cut.proof.leastStations).toBeLessThanOrEqual(whole.stations.length);
      if (cut.status === "feasible") expect(wrongWith(cut, wishes, brake)).toEqual([]);
    }), { numRuns: 200 });
  });

  it("keeps a part that sticks out clear of the next station", () => {
    const wide = (id: string, lineLength: number, sticksOut: number): SharedWish => ({
      id, lineLength, sheet: [-lineLength / 2 - sticksOut, lineLength / 2 + sticksOut], forceKN: 1, ways: [{ punch: "p", die: "v", punchWindow: [-lineLength / 2, lineLength / 2], dieWindow: [-1000, 1000] }],
    });
    const stock = [tool("punch", "p", [50, 100]), tool("die", "v", [50, 100])];
    const [wishes, brake] = [[wide("a", 50, 30), wide("b", 100, 250)], machine(420, 0, 0)];
    const answer = sharedSetup(wishes, stock, brake);
    expect([answer.status, wrongWith(answer, wishes, brake)]).toEqual(["optimal", []]);
    expect(sharedSetup(wishes, stock, machine(399, 0, 0))).toMatchObject({ status: "unknown", reasons: [expect.stringContaining("no part comes to another station")] });
  });

  it("stands the stronger load within the machine's off-centre diagram", () => {
    const strong: SharedWish = { id: "strong", lineLength: 100, sheet: [-50, 50], forceKN: 500, ways: [{ punch: "p", die: "v", punchWindow: [-50, 50], dieWindow: [-500, 500] }] };
    const weak: SharedWish = { ...strong, id: "weak", lineLength: 50, forceKN: 10, ways: [{ punch: "p", die: "v", punchWindow: [-25, 25], dieWindow: [-500, 500] }] };
    const stock = [tool("punch", "p", [50, 100]), tool("die", "v", [50, 100])];
    const plain = machine(1000, 0, 0);
    const brake = { ...plain, settings: { ...plain.settings, offCentre: [[mm(20), 0.4]] as const } };
    const z = (setup: SharedSetup) => Math.abs(setup.stations.flatMap(({ wishes }) => wishes).find(({ id }) => id === "strong")?.z ?? NaN);
    expect(z(sharedSetup([strong, weak], stock, plain))).toBeGreaterThan(20);
    // 500 of 1000 kN: 5/6 of the way to the point at 20 mm.
    expect(z(sharedSetup([strong, weak], stock, brake))).toBeCloseTo(20 * 5 / 6, 6);
    expect(wrongWith(sharedSetup([strong, weak], stock, brake), [strong, weak], brake)).toEqual([]);
    expect(sharedSetup([strong, { ...weak, forceKN: 999 }], stock, brake).status).toBe("unknown");
  });

  it("says what is missing", () => {
    const way: SharedWay = { punch: "p", die: "v", punchWindow: [-500, 500], dieWindow: [-500, 500] };
    const wish: SharedWish = { id: "b1", lineLength: 80, sheet: [-40, 40], forceKN: 1, ways: [way] };
    const [p, v] = [tool("punch", "p", [50, 50]), tool("die", "v", [100])];
    expect(sharedSetup([wish], [p], machine(1000, 0, 0)).reasons).toEqual(["b1: v is not in stock"]);
    expect(sharedSetup([wish], [tool("punch", "p", [50]), v], machine(1000, 0, 0)).reasons[0]).toContain("no pieces make a run for its line of 80 mm");
    const high = tool("punch", "q", [100], 120);
    const other: SharedWish = { ...wish, id: "b2", ways: [{ ...way, punch: "q" }] };
    expect(sharedSetup([wish, other], [p, v, high], machine(1000, 0, 0)).reasons).toEqual([
      "at a shut height of 200 mm no tools make b2; all stations on one bed close at one height", "at a shut height of 220 mm no tools make b1; all stations on one bed close at one height",
    ]);
    const tight = (id: string): SharedWish => ({ ...wish, id, lineLength: id.length * 10, ways: [{ ...way, punchWindow: [-id.length * 5, id.length * 5] }] });
    expect(sharedSetup([tight("aaaaa"), tight("bbbbbbbbbb")], [p, v], machine(1000, 0, 0))).toMatchObject({ status: "infeasible", reasons: [expect.stringContaining("needs 2")] });
  });

  it("gives up where pieces of many odd lengths make more sums than can be looked at", () => {
    const odd = Array.from({ length: 24 }, (_, index) => 50 + ((index ** 3 * 7919) % 9973) / 1000);
    const wish: SharedWish = { id: "b", lineLength: 40, sheet: [-20, 20], forceKN: 1, ways: [{ punch: "p", die: "v", punchWindow: [-500, 500], dieWindow: [-500, 500] }] };
    const answer = sharedSetup([wish], [tool("punch", "p", odd), tool("die", "v", [50])], machine(3000, 0, 0));
    expect([answer.status, answer.reasons]).toEqual(["unknown", [expect.stringContaining("in the effort given")]]);
  });

  it("gives up with what it has", () => {
    const way: SharedWay = { punch: "p", die: "v", punchWindow: [-500, 500], dieWindow: [-500, 500] };
    const wishes = [20, 40].map((lineLength): SharedWish => ({ id: `b${lineLength}`, lineLength, sheet: [-20, 20], forceKN: 1, ways: [way] }));
    expect(sharedSetup(wishes, [tool("punch", "p", [50]), tool("die", "v", [50])], machine(1000, 0, 0), { steps: 0 }).status).toBe("unknown");
  });
});
