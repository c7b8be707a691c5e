import { describe, expect, it, vi } from "vitest";
import type { CertificateFact, FlatCertificate, PlanCertificate } from "../certificates/certificate";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { checkCertificate } from "../certificates/checkCertificate";
import { makeCertificate } from "../certificates/makeCertificate";
import { slowCertificate } from "../certificates/slowCertificate";
import { planCorpus } from "../corpus/planCorpus";

vi.setConfig({ testTimeout: 180_000 });

const withTools = (name: string, tools: readonly string[]): PlanRequest => {
  const request = planCorpus(name);
  return { ...request, tools: request.tools.filter(({ id }) => tools.includes(id)) };
};
const changed = (certificate: PlanCertificate, change: (flat: FlatCertificate) => Partial<FlatCertificate>): PlanCertificate =>
  ({ ...certificate, flats: certificate.flats.map((flat) => ({ ...flat, ...change(flat) })) });
const without = (facts: readonly CertificateFact[], index: number) => facts.filter((_, i) => i !== index);

describe("the checking of certificates, tried on ones made the long way round", () => {
  const hat = withTools("hat", ["P88", "V12"]);
  const good = slowCertificate(hat);
  const deep = withTools("deep-u", ["P88", "V12"]);
  const none = slowCertificate(deep);

  it("holds what is true, and comes to the cost of the plan", () => {
    const checked = checkCertificate(good, hat);
    expect(checked).toMatchObject({ wrong: [], pairs: 1, allPairs: 1 });
    expect(checked.asked).toBe(checked.facts);
    expect(planPart(hat)).toMatchObject({ status: "optimal", cost: checked.bound });
    expect(checkCertificate(none, deep)).toMatchObject({ wrong: [], bound: null });
    expect(planPart(deep).status).toBe("infeasible");
  });

  it("refuses a bound that is too high, a setup that is too dear, another batch, other times", () => {
    for (const damaged of [
      changed(good, ({ perPart }) => ({ perPart: (perPart ?? 0) + 0.5 })), changed(good, () => ({ perPart: null })), changed(none, () => ({ perPart: 20 })),
      changed(good, ({ setup }) => ({ setup: { ...setup, pieces: setup.pieces + 1 } })), changed(good, ({ setup }) => ({ setup: { ...setup, seconds: setup.seconds + 1 } })), changed(good, ({ setup }) => ({ setup: { ...setup, stations: 2 } })),
      { ...good, batch: 21 }, { ...good, times: { ...good.times, flip: 5 } }, { ...good, flats: [] },
    ]) expect(checkCertificate(damaged, damaged.flats === none.flats ? deep : hat, 0).wrong).not.toEqual([]);
  });

  it("refuses strokes left out or turned round", () => {
    for (const moves of [good.flats[0]!.moves.slice(1), good.flats[0]!.moves.map((move) => ({ ...move, up: move.up === 1 ? -1 : 1 } as const)), good.flats[0]!.moves.map((move) => ({ ...move, heading: move.heading + 90 }))]) {
      expect(checkCertificate(changed(good, () => ({ moves })), hat, 0).wrong).not.toEqual([]);
    }
  });

  it("refuses facts that the geometry does not bear out", () => {
    const [made, blocked] = (["made", "blocked"] as const).map((kind) => good.flats[0]!.facts.findIndex((fact) => fact.kind === kind && fact.value !== 0));
    const facts = (index: number | undefined, change: (fact: CertificateFact) => CertificateFact) => changed(good, (flat) => ({ perPart: 0, facts: flat.facts.filter((_, i) => i === index).map(change) }));
    const damaged = [
      facts(made, ({ move, mask, value }) => ({ kind: "blocked", move, mask, value, why: [] })),
      facts(made, (fact) => ({ ...fact, demerit: 1 }) as CertificateFact),
      // One setting under two numbers.
      changed(good, (flat) => ({ perPart: 0, facts: flat.facts.flatMap((fact, i) => (i === made ? [fact, { ...fact, gauges: [99] } as CertificateFact] : [])) })),
      facts(blocked, (fact) => ({ ...fact, mask: 0, value: 0 })),
    ];
    for (const index of [made, blocked]) expect(checkCertificate(facts(index, (fact) => fact), hat).wrong).toEqual([]);
    for (const one of damaged) expect(checkCertificate(one, hat).wrong).not.toEqual([]);
  });

  it("refuses a certificate that lacks a fact on which its bound stands, and only such a one", () => {
    for (const [certificate, request, bound] of [[good, hat, good.flats[0]!.perPart], [none, deep, null]] as const) {
      const flat = certificate.flats[0]!;
      const cost = planPart(request).cost;
      const outcomes = flat.facts.map((_, index) => checkCertificate(changed(certificate, ({ facts }) => ({ facts: without(facts, index) })), request, 0));
      const weaker = outcomes.filter((one) => (bound === null ? one.bound !== null : (one.bound ?? Infinity) < cost - 1e-6));
      expect(weaker.length).toBeGreaterThan(0);
      for (const one of outcomes) expect(one.wrong.length > 0).toBe(weaker.includes(one));
    }
  });
});

describe("certificates of few facts", () => {
  it("come to the same bound as the ones made the long way round", () => {
    for (const [name, tools] of [["hat", ["P88", "V12"]], ["tabs", ["P88", "V12"]], ["small/chain-3", ["P88", "P88-relieved", "V12"]]] as const) {
      const request = withTools(name, tools);
      const [few, all] = [makeCertificate(request).flats[0]!, slowCertificate(request).flats[0]!];
      expect(few.perPart).toBeCloseTo(all.perPart ?? NaN, 6);
      expect(few.facts.length).toBeLessThan(all.facts.length);
    }
  });

  it("prove a plan of six bends, bound one of eight, and prove that no order makes a closed section", () => {
    const six = withTools("corrugated-6", ["P88", "V12"]);
    const checked = checkCertificate(makeCertificate(six), six, 12);
    expect(checked.wrong).toEqual([]);
    expect(planPart(six)).toMatchObject({ status: "optimal", cost: checked.bound });
    const eight = withTools("tray-returns", ["P88", "V12"]);
    const bounded = checkCertificate(makeCertificate(eight), eight, 12);
    expect(bounded.wrong).toEqual([]);
    // The certificate knows nothing of beds: this part needs two stations, and walks.
    const [plan, { times }] = [planPart(eight), eight.machine];
    expect(plan.cost - (bounded.bound ?? 0)).toBeGreaterThan(times.stationSetup);
    expect(plan.cost - (bounded.bound ?? 0)).toBeLessThan(times.stationSetup + 6 * times.sectionPlace + 20);
    const closed = withTools("closed", ["P88", "P88-relieved", "V12"]);
    expect(checkCertificate(makeCertificate(closed), closed, 12)).toMatchObject({ wrong: [], bound: null, pairs: 2, allPairs: 2 });
    expect(planPart(closed).status).toBe("infeasible");
  });
});
