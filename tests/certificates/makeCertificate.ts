import { bendsBehind } from "@/bending/plan/bendsBehind";
import { blockedPattern } from "@/bending/plan/blockedPattern";
import type { CertificateFact, FlatCertificate, PlanCertificate } from "./certificate";
import { createSituation, type SituationFacts } from "@/bending/plan/createSituation";
import { createStepChecks } from "@/bending/plan/createStepChecks";
import { partVariants, type PartVariant } from "@/bending/plan/partVariants";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { Situation } from "@/bending/plan/situation";
import { DEMERIT_SECONDS } from "@/bending/order/orderProblem";
import { askFact, everyPair } from "./askFact";
import { cheapestWay } from "./cheapestWay";
import { strokesByHand } from "./strokesByHand";

/**
 * A certificate with few facts: the cheapest order that the facts so far leave possible is put to the geometry step by step, what is found out becomes a fact, and
 * so on until every step of that order is as the facts say, or no order is left. All pairs that the machine takes are asked.
 */
export function makeCertificate(request: PlanRequest): PlanCertificate {
  const { machine, batch } = request;
  const { flip, turn, stroke, gaugeMove } = machine.times;
  const variants = partVariants(request);
  if (!variants.ok) throw new Error("the part builds");
  const times = { flip, turn, stroke, gaugeMove };
  return { format: "certificate/1", units: "mm", batch, times, demeritSeconds: DEMERIT_SECONDS, flats: variants.value.map((variant) => flatCertificate(request, variant, times)) };
}

function flatCertificate(request: PlanRequest, variant: PartVariant, times: PlanCertificate["times"]): FlatCertificate {
  const { machine } = request;
  const moves = strokesByHand(variant.part);
  if (moves === null) throw new Error("a part of plain bends");
  const pairs = everyPair(request.tools, machine);
  const asked: SituationFacts = { variant, machine, units: request.document.units, pairs, airForceFactor: request.airForceFactor };
  const situation = createSituation(asked);
  const found = createFinder(asked, situation, moves);
  const bends = variant.part.bends.map(({ id }) => id);
  const facts: CertificateFact[] = [];
  const seen = new Set<string>();
  for (;;) {
    const way = cheapestWay({ bends, moves, facts }, times, DEMERIT_SECONDS);
    const before = facts.length;
    let formed = 0;
    for (const move of way?.moves ?? []) {
      const fact = seen.has(`${move}/${formed}`) ? null : found(move, formed);
      seen.add(`${move}/${formed}`);
      if (fact !== null && !facts.some((known) => known.kind === fact.kind && known.move === move && (formed & known.mask) === known.value)) facts.push(fact);
      formed |= moves[move]?.mask ?? 0;
    }
    if (facts.length > before) continue;
    return {
      vOpening: variant.vOpening, bends, moves, facts, pairs: pairs.map(({ punch, die }) => ({ punch: punch.id, die: die.id })),
      setup: { stations: 1, pieces: 2, seconds: machine.times.stationSetup + 2 * machine.times.sectionPlace }, perPart: way?.seconds ?? null,
    };
  }
}

/** What the geometry says of a move in a state, as widely as it holds. */
function createFinder(asked: SituationFacts, situation: Situation, moves: FlatCertificate["moves"]): (move: number, formed: number) => CertificateFact {
  const checks = createStepChecks(situation);
  const { part, pairs } = situation;
  const settings = new Map<string, number>();
  const numberOf = (setting: string): number => {
    const known = settings.get(setting) ?? settings.size;
    settings.set(setting, known);
    return known;
  };
  return (move, formed) => {
    const stroke = moves[move];
    const own = situation.moves.findIndex(({ mask, front }) => mask === stroke?.mask && part.faces[front]?.id === stroke.front);
    const all = (2 ** part.bends.length - 1) & ~(stroke?.mask ?? 0);
    const made = pairs.flatMap((pair) => askFact(asked, situation.moves[own]?.bends ?? [], stroke?.front ?? "", formed, pair) ?? []);
    if (made.length === 0) {
      const pattern = pairs.length === 0 ? { mask: 0, value: 0, why: ["fit"] } : blockedPattern(situation, checks, own, formed);
      return { kind: "blocked", move, ...(pattern ?? { mask: all, value: formed, why: ["room"] }) };
    }
    const behind = bendsBehind(situation, { bends: situation.moves[own]?.bends ?? [], front: situation.moves[own]?.front ?? 0, formed: 0 });
    // In every state that is the same behind the die the sheet is gauged alike; wishes are counted for every pair that fits, whether it can make the stroke or not.
    const fitting = pairs.filter(({ index }) => situation.moves[own]?.bends.every((bend) => situation.fits[bend]?.[index]?.ok));
    const ways = fitting.map(({ index }) => {
      const option = checks.gauges(own, formed, index)[0];
      const [first, last] = [option?.free[0], option?.free[option.free.length - 1]];
      const { fingers, minSpread } = asked.machine.gauge;
      const held = !first || !last ? 0 : fingers > 1 && last[1] - first[0] >= minSpread ? 2 : 1;
      return { setting: option === undefined ? "none" : [option.x.toFixed(2), option.slope.toFixed(4), option.r.toFixed(2)].join(), demerit: checks.wishes(own, index) + 2 - held };
    });
    return { kind: "made", move, mask: behind, value: formed & behind, gauges: [...new Set(ways.map(({ setting }) => numberOf(setting)))], demerit: Math.min(...ways.map(({ demerit }) => demerit)) };
  };
}
