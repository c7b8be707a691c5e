import { formatLength } from "../../core/formatLength";
import { mm } from "../../core/units";
import type { PlanChange } from "../../plan/planChange";
import type { Die, Punch, Tool } from "../../tooling/tool";
import type { Change } from "../createAttempts";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";
import { missingLengths } from "./missingLengths";

/** mm. What is a little shorter is planned too, to prove that the length is the least. */
const LESS_MM = 0.5;

/** Further pieces of owned tools: the fewest, and the shortest when one is enough. Another piece of the punch, else of the die, else of both. */
export function sectionChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, punches: [punch], dies: [die] } = facts;
  if (punch === undefined || die === undefined || (!kinds.has("sections") && !kinds.has("clearance"))) return [];
  attempts.doing("Looking which sections are missing");
  for (const tools of [[punch], [die], [punch, die]]) {
    const change = pieces(facts, tools);
    if (change) return [change];
  }
  return [];
}

function pieces(facts: WhyFacts, tools: readonly (Punch | Die)[]): PlanChange | null {
  const { attempts, situations } = facts;
  const { request } = attempts;
  const before = attempts.plans();
  const change = (lengths: readonly number[]): Change => ({ tools: request.tools.map((tool) => (tools.some(({ id }) => id === tool.id) ? withPieces(tool, lengths) : tool)) });
  const lines = situations.first()?.situation.moves.map(({ halfLength }) => halfLength * 2) ?? [];
  const wholes = missingLengths(lines, [], request.machine.settings);
  if (wholes.length === 0 || attempts.first(change(wholes)).kind !== "works") return null;
  const needed = wholes.reduceRight((kept: readonly number[], one) => {
    const without = kept.filter((length) => length !== one);
    return without.length > 0 && attempts.first(change(without)).kind === "works" ? without : kept;
  }, wholes);
  const least = needed.length > 1 ? needed : [shortest(facts, tools, needed[0] ?? 0, lines, change)];
  const attempt = attempts.first(change(least));
  if (attempt.kind !== "works") return null;
  const less = least.map((length) => length - LESS_MM);
  const fails = least.length === 1 && attempts.first(change(less)).kind === "fails";
  const units = request.document.units;
  const said = least.map((length) => formatLength(length, units)).join(" and ");
  const names = tools.map(({ id }) => id).join(" and ");
  return offeredChange(attempts, before, inUnits({ change: change(least), plan: attempt.plan, ...(fails && less[0] !== undefined ? { notEnough: less[0] } : {}) }, LESS_MM, units), {
    kind: "section", group: "stock", what: { tools: tools.map(({ id }) => id) },
    amount: lengthAmount("length", least[0] ?? 0, units), with: least.slice(1).map((length, k) => lengthAmount(`length of piece ${k + 2}`, length, units)),
    message: `${least.length > 1 ? "Further pieces" : "A further piece"} of ${names}, ${said} long at least${tools.length > 1 ? ", of each" : ""}, would do.`,
  });
}

/** The shortest single piece that makes, with pieces in stock, what one as long as the line makes. */
function shortest({ attempts }: WhyFacts, tools: readonly Tool[], whole: number, lines: readonly number[], change: (lengths: readonly number[]) => Change): number {
  const candidates = missingLengths(lines, tools.length === 1 ? tools[0]?.pieces ?? [] : [], attempts.request.machine.settings).filter((length) => length < whole);
  let [low, high] = [-1, candidates.length];
  while (high - low > 1 && !attempts.ended()) {
    const middle = (low + high) >> 1;
    if (attempts.first(change([candidates[middle] ?? whole])).kind === "works") high = middle;
    else low = middle;
  }
  return candidates[high] ?? whole;
}

const withPieces = (tool: Tool, lengths: readonly number[]): Tool =>
  ({ ...tool, pieces: [...tool.pieces, ...lengths.map((length, k) => ({ id: `new ${tool.id} ${k + 1}`, length: mm(length), horn: null, rack: null }))].sort((a, b) => b.length - a.length) });
