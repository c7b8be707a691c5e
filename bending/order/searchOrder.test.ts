import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { createCostSoFar } from "./createCostSoFar";
import { createFacts } from "./createFacts";
import { everyOrder } from "./everyOrder";
import type { OrderProblem } from "./orderProblem";
import { poseOf } from "./pose";
import { searchLearning } from "./searchLearning";
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

/** A problem that tells some of its answers (to one station at least) without being asked: those of which the number is not 0. */
function telling(problem: OrderProblem, one: (move: number, formed: number) => number): OrderProblem {
  return {
    ...problem,
    least: (move, formed) => {
      if (one(move, formed) === 0) return { demerit: 0, gauges: null };
      const options = Array.from({ length: problem.stations }, (_, station) => problem.option(move, formed, station)).filter((option) => option !== null);
      if (options.length === 0) return null;
      return { demerit: Math.min(...options.map(({ demerit }) => demerit)), gauges: options.map(({ gauge }) => gauge) };
    },
  };
}

/** The least weight that the facts leave, over the last moves that there can be. */
const bounded = (problem: OrderProblem): number => {
  const soFar = createCostSoFar(problem, () => false);
  const all = 2 ** problem.bends - 1;
  return Math.min(...problem.moves.map(({ mask }, move) => soFar?.with(all & ~mask, move) ?? 0));
};

describe("what is known without asking", () => {
  it("changes no answer, however much it is, and saves questions", () => {
    fc.assert(fc.property(problems, fc.nat(4), (problem, seed) => {
      const slow = everyOrder(problem);
      for (const known of [telling(problem, (move, formed) => (move * 3 + formed + seed) % 3), telling(problem, () => 1)]) {
        const fast = searchOrder(known, { soFar: createCostSoFar(known, () => false) });
        expect(fast.kind).toBe(slow === null ? "none" : "found");
        if (slow && fast.kind === "found") expect(fast.weight).toBeCloseTo(slow.weight, 6);
      }
    }), { numRuns: 150 });
  });

  it("never bounds an order above its weight, and of one station comes to it when everything is known", () => {
    fc.assert(fc.property(problems, fc.nat(4), (problem, seed) => {
      const weight = everyOrder(problem)?.weight ?? Infinity;
      const some = bounded(telling(problem, (move, formed) => (move * 3 + formed + seed) % 3));
      expect(some).toBeLessThanOrEqual(weight + 1e-6);
      const all = bounded(telling(problem, () => 1));
      expect(all).toBeLessThanOrEqual(weight + 1e-6);
      expect(all).toBeGreaterThanOrEqual(some - 1e-6);
      if (problem.stations === 1) { if (weight < Infinity) expect(all).toBeCloseTo(weight, 6); else expect(all).toBe(Infinity); }
    }), { numRuns: 150 });
  });

  it("may be learned on the way: the same answer", () => {
    fc.assert(fc.property(problems, (problem) => {
      const facts = createFacts(problem.moves.length);
      const all = 2 ** problem.bends - 1;
      const learning = {
        ...problem, stations: 1,
        least: (move: number, formed: number) => (facts.blocked(move, formed) ? null : { demerit: 0, gauges: null }),
        learned: facts.count,
        option: (move: number, formed: number) => {
          const answer = problem.option(move, formed, 0);
          if (answer === null) facts.block(move, { mask: all, value: formed });
          return answer;
        },
      };
      const slow = everyOrder({ ...problem, stations: 1 });
      const { outcome } = searchLearning(learning, {});
      expect(outcome.kind).toBe(slow === null ? "none" : "found");
      if (slow && outcome.kind === "found") expect(outcome.weight).toBeCloseTo(slow.weight, 6);
    }), { numRuns: 150 });
  });

  it("in haste finds some order where there is one, never a better one than there is", () => {
    fc.assert(fc.property(problems, (problem) => {
      const slow = everyOrder(problem);
      const hasty = searchOrder(problem, { haste: 3 });
      expect(hasty.kind).toBe(slow === null ? "none" : "found");
      if (slow && hasty.kind === "found") expect(hasty.weight).toBeGreaterThanOrEqual(slow.weight - 1e-6);
    }), { numRuns: 100 });
  });
});
