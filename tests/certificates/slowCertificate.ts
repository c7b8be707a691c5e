import type { CertificateFact, PlanCertificate } from "./certificate";
import { partVariants } from "@/bending/plan/partVariants";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { SituationFacts } from "@/bending/plan/createSituation";
import { askFact, everyPair } from "./askFact";
import { cheapestWay } from "./cheapestWay";
import { strokesByHand } from "./strokesByHand";

/** A certificate made the long way round, every state of every stroke asked for itself: to try the checking on, for parts of few bends whose document gives every radius. */
export function slowCertificate(request: PlanRequest): PlanCertificate {
  const { machine, batch } = request;
  const variants = partVariants(request);
  const variant = variants.ok ? variants.value[0] : undefined;
  const moves = variant ? strokesByHand(variant.part) : null;
  if (!variant || moves === null) throw new Error("a part of plain bends");
  const situation: SituationFacts = { variant, machine, units: request.document.units, pairs: [] };
  const pairs = everyPair(request.tools, machine);
  const bends = variant.part.bends.map(({ id }) => id);
  const all = 2 ** bends.length - 1;
  const settings = new Map<string, number>();
  const facts = moves.flatMap(({ mask, front }, move) => Array.from({ length: all + 1 }, (_, formed) => formed).filter((formed) => (formed & mask) === 0).map((formed): CertificateFact => {
    const made = pairs.flatMap((pair) => askFact(situation, bends.flatMap((_, bend) => ((mask >> bend) & 1 ? [bend] : [])), front, formed, pair) ?? []);
    const state = { move, mask: all & ~mask, value: formed };
    if (made.length === 0) return { kind: "blocked", ...state, why: ["asked pair by pair"] };
    const gauges = [...new Set(made.map(({ setting }) => {
      settings.set(setting, settings.get(setting) ?? settings.size);
      return settings.get(setting) as number;
    }))];
    return { kind: "made", ...state, gauges, demerit: Math.min(...made.map(({ demerit }) => demerit)) };
  }));
  const { flip, turn, stroke, gaugeMove, stationSetup, sectionPlace } = machine.times;
  const times = { flip, turn, stroke, gaugeMove };
  const flat = { vOpening: variant.vOpening, bends, moves, pairs: pairs.map(({ punch, die }) => ({ punch: punch.id, die: die.id })), facts, setup: { stations: 1, pieces: 2, seconds: stationSetup + 2 * sectionPlace }, perPart: null };
  return { format: "certificate/1", units: "mm", batch, times, demeritSeconds: 1e6, flats: [{ ...flat, perPart: cheapestWay(flat, times, 1e6)?.seconds ?? null }] };
}
