import { describe, expect, it } from "vitest";
import { deg, mm, toDeg, toRad, type LengthUnit } from "@/bending/core/units";
import { applyCure } from "@/bending/findings/applyCure";
import { airBendForce } from "@/bending/handbook/airBendForce";
import type { PartDocument } from "@/bending/part/partDocument";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { ChangeKind, PlanChange } from "@/bending/plan/planChange";
import { planPart } from "@/bending/plan/planPart";
import type { CheckRequest, PlanRequest } from "@/bending/plan/planRequest";
import { readPlanDocument } from "@/bending/plan/readPlanDocument";
import { relievedPunchProfile } from "@/bending/tooling/relievedPunchProfile";
import { firstFailure } from "@/bending/whyNot/firstFailure";
import { hemDie } from "@/bending/whyNot/newTool/hemDie";
import { straightPunch } from "@/bending/whyNot/newTool/straightPunch";
import { whyNot } from "@/bending/whyNot/whyNot";
import { planCorpus } from "../corpus/planCorpus";
import { withLengths } from "./lawRequests";

const u = planCorpus("u");
const works = (request: PlanRequest) => planPart({ ...request, firstPlan: true }).steps.length > 0;
const asked = (request: PlanRequest | CheckRequest, plans?: number) =>
  whyNot(request, "order" in request ? checkOrder(request) : planPart(request), plans === undefined ? {} : { plans });
const ofKind = (changes: readonly PlanChange[], kind: ChangeKind): readonly PlanChange[] => changes.filter((change) => change.kind === kind);
const profile = (legs: readonly number[], angle: number, more: object = {}): PlanRequest =>
  ({ ...u, document: { ...u.document, profile: { width: 300, legs, bends: legs.slice(1).map(() => ({ angle, direction: "up" })) }, ...more } as unknown as PartDocument });
const withField = (request: PlanRequest, path: string, value: number): PlanRequest => ({ ...request, document: applyCure<PartDocument>(request.document, { path, value, says: "" }) });

describe("a deep U without a relieved punch", () => {
  const request: PlanRequest = { ...planCorpus("deep-u"), tools: planCorpus("deep-u").tools.filter(({ id }) => id !== "P88-relieved") };
  const plan = planPart(request);
  const found = whyNot(request, plan);

  // The web's outside is 50, the legs' 70, the sheet 2 thick; the last stroke goes to 90.2 degrees, half of it on each side. The standing leg's inner
  // corner is 48 along the web and 70 over it. Bevelled corners of the grown punch stand off up to 1.083 of the margin of 1.
  const half = (90.2012 / 2) * (Math.PI / 180);
  const corner = (leg: number, web: number) => leg * Math.sin(half) - (web - 2) * Math.cos(half);

  it("ends after the first bend, and says that the other place would do", () => {
    expect(found.complete).toBe(true);
    expect(found.firstFailure).toMatchObject({ done: ["b1"], step: null, strokes: [{ bends: ["b2"], wouldWork: [{ before: ["b1"], after: [] }] }] });
    expect(found.firstFailure?.strokes[0]?.reasons[0]).toMatchObject({ kind: "clearance", fronts: ["b1", "b2"], pairs: [{ punch: "P88", die: "V12" }, { punch: "P88", die: "V16" }] });
  });

  it("needs the relief that geometry asks for, and not half a millimetre less", () => {
    const [relief] = ofKind(found.changes, "punch-relief");
    const depth = relief?.amount?.value ?? NaN;
    expect(depth).toBeGreaterThanOrEqual(corner(70, 50) + 1);
    expect(depth).toBeLessThan(corner(70, 50) + 1.083 + 0.5);
    expect(relief?.found.notEnough).toBe(depth - 0.5);
    const [top, height] = [relief?.with[0]?.value ?? NaN, relief?.with[1]?.value ?? NaN];
    const owned = request.tools.find((tool) => tool.id === "P88");
    if (owned?.kind !== "punch") throw new Error("the corpus has P88");
    const relieved = (by: number, upTo: number) => ({
      ...owned, id: "R", height: mm(height), pieces: owned.pieces.map((piece) => ({ ...piece, id: `R ${piece.id}` })),
      profile: relievedPunchProfile({ tipAngle: owned.tipAngle, tipRadius: owned.tipRadius, height: mm(height), bodyWidth: mm(20), reliefDepth: mm(by), reliefHeight: mm(upTo) }),
    });
    const withPunch = (by: number, upTo: number) => works({ ...request, tools: [...request.tools, relieved(by, upTo)] });
    expect([withPunch(depth, top), withPunch(depth, top - 1), withPunch(depth - 0.5, top), withPunch(depth - 0.5, 100)]).toEqual([true, false, false, false]);
  });

  it("would do with a leg as short, or a web as long, as lets the straight punch by", () => {
    const shorter = ofKind(found.changes, "shorter-flange");
    expect(shorter.map(({ what }) => what.path).sort()).toEqual(["profile.legs[0]", "profile.legs[2]"]);
    // The corner stays in front of the punch's body of 20: corner(leg, 50) <= -10 - margin.
    const leg = (margin: number) => (48 * Math.cos(half) - 10 - margin) / Math.sin(half);
    const web = (margin: number) => 2 + (10 + margin + 70 * Math.sin(half)) / Math.cos(half);
    for (const { amount } of shorter) expect(amount?.value).toBe(Math.floor(leg(1.083) * 2) / 2);
    const [longer] = ofKind(found.changes, "longer-flange");
    expect([longer?.what.path, longer?.amount?.value]).toEqual(["profile.legs[1]", Math.ceil(web(1.083) * 2) / 2]);
    for (const { what, amount, found: proof } of [...shorter, ...(longer ? [longer] : [])]) {
      expect(works(withField(request, what.path ?? "", amount?.value ?? NaN))).toBe(true);
      expect(planPart(withField(request, what.path ?? "", proof.notEnough ?? NaN)).status).toBe("infeasible");
    }
  });

  it("lists tools before the part, and the plan holds it all", () => {
    expect(found.changes[0]?.group).toBe("tool");
    const whole = { ...plan, changes: found.changes, ...(found.firstFailure ? { firstFailure: found.firstFailure } : {}) };
    expect(readPlanDocument(JSON.parse(JSON.stringify(whole)))).toEqual({ ok: true, value: whole });
  });
});

describe("the least changes", () => {
  it("a missing piece: as long as the line less its uncovered ends, the pieces in stock and the gaps between", () => {
    const request = { ...u, tools: u.tools.map((tool) => (tool.kind === "punch" ? withLengths(tool, [50, 40, 30, 20, 15, 10, 10]) : tool)) };
    const [section] = ofKind(asked(request).changes, "section");
    expect(section).toMatchObject({ group: "stock", amount: { value: 300 - 2 * 5 - 175 - 7 * 5, unit: "mm" }, found: { notEnough: 79.5 } });
    const id = section?.what.tools?.[0];
    const longer = (length: number) => works({ ...request, tools: request.tools.map((tool) => (tool.id === id ? withLengths(tool, [50, 40, 30, 20, 15, 10, 10, length]) : tool)) });
    expect([longer(80), longer(79.5)]).toEqual([true, false]);
  });

  it("a flange that is too short: what the V needs, rounded up", () => {
    const request = profile([60, 5], 90);
    const short = /(\d+\.\d+) mm more flange/.exec(planPart(request).reasons[0]?.message ?? "")?.[1];
    const [longer] = ofKind(asked(request).changes, "longer-flange");
    expect(longer?.amount).toMatchObject({ value: Math.ceil((5 + Number(short)) * 2) / 2, from: 5 });
    expect([works(withField(request, "profile.legs[1]", 8)), works(withField(request, "profile.legs[1]", longer?.found.notEnough ?? NaN))]).toEqual([true, false]);
  });

  it("the bluntest tools for a sharp bend: one degree under what its stroke goes to", () => {
    const plan = planPart(profile([60, 60], 120));
    const included = Number(/taken to ([\d.]+)° included/.exec(plan.reasons[0]?.message ?? "")?.[1]);
    const [sharper] = ofKind(asked(profile([60, 60], 120)).changes, "tool-angle");
    expect([sharper?.amount?.value, sharper?.found.notEnough]).toEqual([Math.floor(included), Math.floor(included) + 1]);
  });

  it("a die that closes a hem: a slot just as high as the leg stands after the acute stroke, rated for the closing", () => {
    const request = planCorpus("hem");
    const [hem] = ofKind(asked(request).changes, "hem-die");
    const [opening, rating] = [hem?.amount?.value ?? NaN, hem?.with[2]?.value ?? NaN];
    const like = request.tools.find(({ id }) => id === "V12");
    const punch = request.tools.find(({ id }) => id === "P88");
    if (like?.kind !== "die" || punch?.kind !== "punch") throw new Error("the corpus has V12 and P88");
    const planned = (slot: number, kN: number) => planPart({ ...request, tools: [...request.tools, hemDie(like, { vOpening: 12, opening: slot, depth: 31, rating: kN }), straightPunch(punch, 20, toRad(deg(26)))] });
    const stands = Number(/stands ([\d.]+) mm high/.exec(planned(opening - 1, rating).reasons[0]?.message ?? "")?.[1]);
    expect([opening, hem?.found.notEnough]).toEqual([Math.ceil(stands), Math.ceil(stands) - 1]);
    expect([planned(opening, rating).steps.length, planned(opening, rating - 1).status]).toEqual([1, "infeasible"]);
  });

  it("force and rating: no more than the bend needs, and nothing is loaded beyond what it bears", () => {
    const weakBrake = asked({ ...u, machine: { ...u.machine, maxForce: 50 as typeof u.machine.maxForce } }).changes;
    const tensile = u.materials("S235")?.tensile[1];
    if (tensile === undefined) throw new Error("the corpus's material is known");
    const over = (v: number) => airBendForce(tensile, mm(2), mm(v));
    expect(ofKind(weakBrake, "force")[0]?.amount?.value).toBe(Math.ceil(over(16) * 0.3));
    const opening = ofKind(weakBrake, "die-opening")[0]?.amount?.value ?? NaN;
    expect([over(opening) * 0.3 <= 50, over(opening - 0.5) * 0.3 <= 50]).toEqual([true, false]);
    const weakTool = asked({ ...u, tools: u.tools.map((tool) => (tool.kind === "die" ? { ...tool, maxForcePerMetre: 150 as typeof tool.maxForcePerMetre } : tool)) }).changes;
    expect(ofKind(weakTool, "tool-rating")[0]).toMatchObject({ amount: { value: Math.ceil(over(16)), from: 150, unit: "kN/m" }, found: { notEnough: Math.ceil(over(16)) - 1 } });
  });

  it("a choice of a person's that stands in the way is left free, and neither part nor brake is blamed for it", () => {
    const found = asked({ ...u, wishes: [{ bend: "b1", punch: "P88" }, { bend: "b2", punch: "gone" }] }, 20);
    expect(found.changes.map(({ kind, what }) => [kind, what.bends])).toEqual([["free-choice", ["b2"]]]);
  });

  it("a longer bed: the line less its uncovered ends", () => {
    const [bed] = asked({ ...u, machine: { ...u.machine, bedLength: mm(200) } }).changes;
    expect(bed).toMatchObject({ kind: "bed-length", group: "machine", amount: { value: 300 - 2 * 5, from: 200 }, found: { notEnough: 285 } });
  });

  it("are in the document's unit", () => {
    const request = planCorpus("no-radius");
    const short = { ...request, tools: request.tools.map((tool) => (tool.kind === "punch" ? withLengths(tool, [50, 40, 30, 20, 15, 10, 10]) : tool)) };
    expect(ofKind(asked(short).changes, "section")[0]?.amount).toEqual({ name: "length", value: Math.round(((254 - 10 - 175 - 35) / 25.4) * 1e6) / 1e6, unit: "in" satisfies LengthUnit });
  });

  it("come out alike each time, and end with the budget", () => {
    const request = profile([60, 5], 90);
    expect(asked(request)).toEqual(asked(request));
    const early = asked(request, 3);
    expect([early.complete, early.plans]).toEqual([false, 3]);
    expect(whyNot(request, planPart(request), { shouldStop: () => true })).toMatchObject({ changes: [], complete: false });
  });
});

describe("a person's own order", () => {
  const hat = planCorpus("hat");
  const orders = permutations(["b1", "b2", "b3", "b4"]);
  const possible = orders.filter((order) => checkOrder({ ...hat, order, firstPlan: true }).steps.length > 0);

  it("fails at a step exactly when there is no plan with it", () => {
    expect(possible.length).toBeGreaterThan(0);
    expect(orders.filter((order) => firstFailure({ ...hat, order }) === null)).toEqual(possible);
  });

  it("says how far it gets, what is in the way, and which bend would have to come later", () => {
    const failure = firstFailure({ ...hat, order: ["b2", "b3", "b1", "b4"] });
    expect(failure).toMatchObject({ done: ["b2", "b3"], step: 3 });
    const [stroke] = failure?.strokes ?? [];
    expect([stroke?.bends, stroke?.reasons.length]).toEqual([["b1"], expect.any(Number)]);
    expect(stroke?.reasons[0]).toMatchObject({ kind: "clearance", faces: ["b3"], evidence: { depth: 19 } });
    expect(stroke?.wouldWork).toContainEqual({ before: ["b2"], after: [] });
    expect(failure?.message).toContain("b1 by itself works before b2");
  });

  it("is mended by moving as few bends as any order that works needs", () => {
    const own = ["b2", "b3", "b1", "b4"];
    const [move] = whyNot({ ...hat, order: own }, checkOrder({ ...hat, order: own }), { plans: 3 }).changes;
    const fewest = Math.min(...possible.map((order) => own.length - longestKept(own, order)));
    expect([move?.kind, move?.amount?.value, move?.order?.length]).toEqual(["move-bends", fewest, 4]);
    expect(possible).toContainEqual(move?.order);
  });

  it("with a stroke of two bends that no run of pieces covers works with one after the other", () => {
    const tabs = planCorpus("tabs");
    const document = { ...tabs.document, flanges: tabs.document.flanges?.filter(({ id }) => id !== "back") ?? [] } as PartDocument;
    const own = { ...tabs, document, tools: tabs.tools.map((tool) => withLengths(tool, [85])), order: ["tabLeft+tabRight"] };
    const [split] = whyNot(own, checkOrder(own), { plans: 2 }).changes;
    expect(split).toMatchObject({ kind: "one-by-one", group: "order", order: ["tabLeft", "tabRight"] });
  });
});

it("sizes of the corpus's punch that the sums above stand on", () => {
  const owned = u.tools.find(({ id }) => id === "P88");
  expect([Math.max(...(owned?.profile.map(([x]) => x) ?? [])), owned?.kind === "punch" ? Math.round(toDeg(owned.tipAngle)) : 0, u.machine.settings.clearance]).toEqual([10, 88, 1]);
});

function permutations<T>(items: readonly T[]): readonly (readonly T[])[] {
  return items.length === 0 ? [[]] : items.flatMap((item, i) => permutations([...items.slice(0, i), ...items.slice(i + 1)]).map((rest) => [item, ...rest]));
}

/** The most entries of one order that keep their sequence in another. */
function longestKept(own: readonly string[], other: readonly string[]): number {
  const places = other.map((entry) => own.indexOf(entry));
  const ending = places.map(() => 1);
  places.forEach((place, i) => places.slice(0, i).forEach((before, j) => { if (before < place) ending[i] = Math.max(ending[i] ?? 1, (ending[j] ?? 1) + 1); }));
  return Math.max(...ending);
}
