import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { everyOrder } from "./everyOrder";
import type { OrderProblem } from "./orderProblem";
import { poseOf } from "./pose";
import { searchOrder } from "./searchOrder";

vi.setConfig({ testTimeout: 60_000 });

interface Pattern { readonly move: number; readonly station: number; readonly mask: number; readonly value: number }

/** A random problem: up to six bends in four directions, two sides, forbidden by patterns over the formed set. */
const problems = fc.record({
  bends: fc.array(fc.record({ up: fc.boolean(), heading: fc.nat(7) }), { minLength: 1, maxLength: 6 }),
  stations: fc.integer({ min: 1, max: 2 }),
  patterns: fc.array(fc.record({ move: fc.nat(13), station: fc.nat(1), mask: fc.nat(63), value: fc.nat(63) }), { maxLength: 24 }),
  joined: fc.boolean(),
  gaugeSeed: fc.nat(3),
  wishSeed: fc.nat(9),
}).map(({ bends, stations, patterns, joined, gaugeSeed, wishSeed }): OrderProblem => {
  const moves = bends.flatMap(({ up, heading }, bend) => [0, Math.PI].map((turned) => {
    const angle = (heading * Math.PI) / 4 + turned;
    return { mask: 1 << bend, pose: poseOf(up ? 1 : -1, Math.cos(angle), Math.sin(angle)) };
  }));
  const first = moves[0];
  const all = joined && first !== undefined && bends.length > 1 && bends[0]?.up === bends[1]?.up ? [...moves, { mask: 3, pose: first.pose }] : moves;
  const blocked = (move: number, formed: number, station: number) =>
    patterns.some((p: Pattern) => p.move === move && p.station === station && (formed & p.mask) === (p.value & p.mask) && p.mask !== 0);
  return {
    bends: bends.length, moves: all, stations: bends.length > 4 ? 1 : stations,
    times: { flip: 4, turn: 3, stroke: 4, gaugeMove: 1.5 },
    walk: (from, to) => Math.abs(from - to) * 1.1,
    option: (move, formed, station) => (blocked(move, formed, station) ? null
      : { gauge: (move * 5 + formed * gaugeSeed) % 3, demerit: (move + formed + wishSeed) % 7 === 0 ? 1 : 0 }),
  };
});

describe("searchOrder", () => {
  it("finds what trying every order finds, and none when there is none", () => {
    fc.assert(fc.property(problems, (problem) => {
      const slow = everyOrder(problem);
      const fast = searchOrder(problem);
      if (slow === null) { expect(fast.kind).toBe("none"); return; }
      expect(fast.kind).toBe("found");
      if (fast.kind === "found") expect(fast.weight).toBeCloseTo(slow.weight, 6);
    }), { numRuns: 250 });
  });

  it("costs twice as much when every time is doubled", () => {
    fc.assert(fc.property(problems, (problem) => {
      const once = searchOrder(problem);
      const { flip, turn, stroke, gaugeMove } = problem.times;
      const twice = searchOrder({ ...problem, times: { flip: 2 * flip, turn: 2 * turn, stroke: 2 * stroke, gaugeMove: 2 * gaugeMove }, walk: (a, b) => 2 * problem.walk(a, b) });
      expect(twice.kind).toBe(once.kind);
      if (once.kind === "found" && twice.kind === "found") expect(twice.seconds).toBeCloseTo(2 * once.seconds, 6);
    }), { numRuns: 100 });
  });

  it("gives the same answer twice and a legal one", () => {
    fc.assert(fc.property(problems, (problem) => {
      const answer = searchOrder(problem);
      expect(searchOrder(problem)).toEqual(answer);
      if (answer.kind !== "found") return;
      let formed = 0;
      for (const step of answer.steps) {
        expect(step.formed).toBe(formed);
        expect(problem.option(step.move, formed, step.station)).not.toBeNull();
        formed |= problem.moves[step.move]?.mask ?? 0;
      }
      expect(formed).toBe(2 ** problem.bends - 1);
    }), { numRuns: 100 });
  });

  it("says that it stopped, with a bound, when told to stop", () => {
    const free: OrderProblem = {
      bends: 5, stations: 1, times: { flip: 4, turn: 3, stroke: 4, gaugeMove: 1.5 }, walk: () => 0,
      moves: [0, 1, 2, 3, 4].map((bend) => ({ mask: 1 << bend, pose: poseOf(1, 1, 0) })),
      option: (move) => ({ gauge: move, demerit: 0 }),
    };
    const stopped = searchOrder(free, { shouldStop: () => true });
    const whole = searchOrder(free);
    expect(stopped.kind).toBe("stopped");
    if (stopped.kind === "stopped" && whole.kind === "found") expect(stopped.bound).toBeLessThanOrEqual(whole.weight);
  });
});
