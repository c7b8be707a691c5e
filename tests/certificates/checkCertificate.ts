import type { CertificateFact, FlatCertificate, PlanCertificate } from "./certificate";
import type { SituationFacts } from "@/bending/plan/createSituation";
import { partVariants } from "@/bending/plan/partVariants";
import type { PlanRequest } from "@/bending/plan/planRequest";
import type { ToolPair } from "@/bending/plan/toolPair";
import { askFact, everyPair } from "./askFact";
import { cheapestWay } from "./cheapestWay";
import { shortestRun } from "./shortestRun";
import { strokesByHand } from "./strokesByHand";

export interface CheckedCertificate {
  /** What is wrong; empty when the certificate holds as far as it was asked. */
  readonly wrong: readonly string[];
  /** Seconds that no plan goes below, unmet wishes weighed in; null when there is no order in any flat. */
  readonly bound: number | null;
  readonly facts: number;
  /** Facts of those that were put to the geometry. */
  readonly asked: number;
  /** Tool pairs that it speaks of, of those that the machine takes. */
  readonly pairs: number;
  readonly allPairs: number;
}

/** Seconds. Over the rounding of sums, under anything that a step costs. */
const SAME_SECONDS = 1e-4;

/**
 * Checks a certificate with nothing of the planner's search: strokes from the drawing, the bound by a plain dynamic programme over the facts, the setup from
 * the stock, and each fact put to the geometry anew, in the emptiest, the fullest and one more of the states that it speaks of. `most`: so many facts of each flat,
 * spread evenly, are put to the geometry; the arithmetic is always done over all of them.
 */
export function checkCertificate(certificate: PlanCertificate, request: PlanRequest, most = Infinity): CheckedCertificate {
  const wrong: string[] = [];
  const { machine, batch } = request;
  if (certificate.batch !== batch) wrong.push(`it is for a batch of ${certificate.batch}, not ${batch}`);
  for (const key of ["flip", "turn", "stroke", "gaugeMove"] as const) if (certificate.times[key] !== machine.times[key]) wrong.push(`${key} takes ${machine.times[key]} s, it says ${certificate.times[key]}`);
  const variants = partVariants(request);
  if (!variants.ok) return { wrong: [...wrong, "the part does not build"], bound: null, facts: 0, asked: 0, pairs: 0, allPairs: 0 };
  let [asked, facts, pairs, allPairs] = [0, 0, 0, 0];
  const bounds: number[] = [];
  for (const flat of certificate.flats) {
    const name = flat.vOpening === null ? "the flat" : `the flat for a V of ${flat.vOpening}`;
    const variant = variants.value.find(({ vOpening }) => vOpening === flat.vOpening);
    if (!variant) { wrong.push(`${name} is none of this part's`); continue; }
    const situation: SituationFacts = { variant, machine, units: request.document.units, pairs: [], airForceFactor: request.airForceFactor };
    const known = everyPair(request.tools, machine);
    const spoken = flat.pairs.flatMap(({ punch, die }) => known.filter((pair) => pair.punch.id === punch && pair.die.id === die));
    if (spoken.length !== flat.pairs.length) wrong.push(`${name}: it speaks of pairs that are not in service`);
    const said = (texts: readonly string[]) => wrong.push(...texts.map((text) => `${name}: ${text}`));
    said(strokesWrong(flat, situation));
    const weight = cheapestWay(flat, certificate.times, certificate.demeritSeconds)?.seconds ?? null;
    said(boundWrong(flat, weight));
    said(setupWrong(flat, situation, spoken));
    if (weight !== null) bounds.push(flat.setup.seconds + batch * weight);
    const some = spread(flat.facts, most);
    said(factsWrong(flat, some, situation, spoken));
    asked += some.length;
    facts += flat.facts.length;
    pairs = Math.max(pairs, spoken.length);
    allPairs = Math.max(allPairs, known.length);
  }
  if (bounds.length === 0 && variants.value.some(({ vOpening }) => !certificate.flats.some((flat) => flat.vOpening === vOpening))) wrong.push("it leaves out a flat that might be made");
  return { wrong, bound: bounds.length === 0 ? null : Math.min(...bounds), facts, asked, pairs, allPairs };
}

function spread<T>(items: readonly T[], most: number): readonly T[] {
  if (items.length <= most) return items;
  return Array.from({ length: most }, (_, i) => items[Math.floor((i * items.length) / most)] as T);
}

function strokesWrong(flat: FlatCertificate, { variant: { part } }: SituationFacts): readonly string[] {
  const strokes = strokesByHand(part);
  if (strokes === null) return ["hems and offsets are not worked out by hand here"];
  const print = ({ mask, front, up, heading }: (typeof strokes)[number]) => `${mask} ${front} ${up} ${(Math.round(heading * 10) % 3600) / 10}`;
  const own = new Set(strokes.map(print));
  const theirs = new Set(flat.moves.map(print));
  const bends = part.bends.map(({ id }) => id).join() === flat.bends.join() ? [] : ["its bends are others"];
  return [...bends, ...[...own].filter((one) => !theirs.has(one)).map((one) => `it leaves out the stroke ${one}`), ...[...theirs].filter((one) => !own.has(one)).map((one) => `${one} is no stroke of this part`)];
}

function boundWrong({ perPart }: FlatCertificate, weight: number | null): readonly string[] {
  if ((perPart === null) !== (weight === null)) return [perPart === null ? "its facts leave an order possible" : "its facts leave no order possible, it speaks of one"];
  return perPart !== null && weight !== null && perPart > weight + SAME_SECONDS ? [`its facts bound a part by ${weight} s, it says ${perPart}`] : [];
}

/** One station at the least, of as few pieces as the bend that needs most of them can be made with. */
function setupWrong({ setup, perPart }: FlatCertificate, { variant: { part }, machine }: SituationFacts, pairs: readonly ToolPair[]): readonly string[] {
  if (perPart === null) return [];
  const { maxUncoveredEnd, maxSectionGap } = machine.settings;
  const fewest = (length: number) => Math.min(...pairs.map((pair) => [pair.punch, pair.die].reduce((sum, tool) => sum + shortestRun(tool, Math.max(5, length - 2 * maxUncoveredEnd), maxSectionGap).pieces, 0)));
  const least = Math.max(...part.bends.map(({ line: [a, b] }) => fewest(Math.hypot(b[0] - a[0], b[1] - a[1]))));
  const seconds = setup.stations * machine.times.stationSetup + setup.pieces * machine.times.sectionPlace;
  return [
    ...(setup.stations > 1 ? [`nothing says that ${setup.stations} stations are needed`] : []),
    ...(setup.pieces > least ? [`${least} pieces may be enough, it counts ${setup.pieces}`] : []),
    ...(setup.seconds > seconds + SAME_SECONDS ? [`so much setup takes ${seconds} s, it says ${setup.seconds}`] : []),
  ];
}

/** Every fact in three of its states, with every pair that it speaks of. Equal settings must be able to have one number: the one that all facts which saw them name. */
function factsWrong({ bends, moves }: FlatCertificate, facts: readonly CertificateFact[], situation: SituationFacts, pairs: readonly ToolPair[]): readonly string[] {
  const wrong: string[] = [];
  const numbers = new Map<string, readonly number[]>();
  for (const fact of facts) {
    const move = moves[fact.move];
    if (!move) { wrong.push(`there is no move ${fact.move}`); continue; }
    const own = bends.flatMap((_, bend) => ((move.mask >> bend) & 1 ? [bend] : []));
    const name = `move ${own.map((bend) => bends[bend]).join("+")} with ${move.front} in front`;
    for (const formed of statesOf(fact, move.mask, 2 ** bends.length - 1)) {
      for (const pair of pairs) {
        const stroke = askFact(situation, own, move.front, formed, pair);
        if (stroke === null) continue;
        const where = `${name}, set ${formed}, ${pair.punch.id} over ${pair.die.id}`;
        if (fact.kind === "blocked") { wrong.push(`${where}: it is said to be blocked and can be made`); continue; }
        if (stroke.demerit < fact.demerit) wrong.push(`${where}: ${stroke.demerit} wishes are left unmet, not ${fact.demerit}`);
        if (fact.gauges === null) continue;
        const known = numbers.get(stroke.setting);
        const left = known === undefined ? fact.gauges : known.filter((one) => fact.gauges?.includes(one));
        if (left.length === 0) wrong.push(`${where}: the gauge stands at ${stroke.setting}, which is none of ${fact.gauges.join(", ")}`);
        else numbers.set(stroke.setting, left);
      }
    }
  }
  return wrong;
}

/** The emptiest and the fullest state that agree with a fact, and one between; those in which the move is not made already. */
function statesOf({ mask, value, move }: CertificateFact, own: number, all: number): readonly number[] {
  if (value & own) return [];
  const free = all & ~mask & ~own;
  const some = free & ((0x9e3779b1 * (value + 7 * move + 1)) >>> 2);
  return [...new Set([value, value | free, value | some])];
}
