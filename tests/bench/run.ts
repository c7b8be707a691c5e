import { createHash } from "node:crypto";
import { everyOrder } from "@/bending/order/everyOrder";
import { searchOrder } from "@/bending/order/searchOrder";
import { clearanceQuestions } from "./clearanceQuestions";
import { findingParts, judged, partOf } from "./findingParts";
import { planRows } from "./planRows";
import { randomProblem } from "./randomProblem";
import { dayOfBends, dayOnOneBed } from "./sharedSetups";
import { asFlat, comb, corrugated, unfold } from "./unfoldQuestions";

interface Row {
  readonly name: string;
  readonly size: number;
  readonly medianMs: number;
  readonly runs: number;
  readonly checksum: string;
  readonly peakMB: number;
  readonly reference?: string;
  readonly ratio?: number;
  /** How much longer one bend more takes, against the row before of the same name. */
  readonly growth?: number;
  /** What a plan came to, and how far its bound is off: (best - bound) / best. */
  readonly status?: string;
  readonly gap?: number;
}

const RUNS = 3;
const median = (values: readonly number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
const peakMB = () => Math.round(process.resourceUsage().maxRSS / 1024);
const digest = (value: unknown) => createHash("sha256").update(JSON.stringify(value)).digest("hex").slice(0, 12);

function timed<T>(run: () => T, runs = RUNS): { readonly medianMs: number; readonly answer: T } {
  const times: number[] = [];
  let answer: T | undefined;
  for (let i = 0; i < runs; i += 1) {
    const started = performance.now();
    answer = run();
    times.push(performance.now() - started);
  }
  return { medianMs: Math.round(median(times) * 100) / 100, answer: answer as T };
}

/** Whole plans with everything that the invented shop has: tools, order, stations, gauge; proven, or with the gap that is left. */
function plans(): readonly Row[] {
  return planRows().map(({ name, size, runs, plan }): Row => {
    const { medianMs, answer } = timed(plan, runs);
    return { name, size, medianMs, runs, checksum: digest([answer.status, answer.cost, answer.order]), peakMB: peakMB(), status: answer.status, gap: Math.round(answer.gap * 1e4) / 1e4 };
  });
}

/** The order search alone on made-up patterns, against trying every order in the same process. */
function searches(): readonly Row[] {
  return [3, 4, 5, 6, 8, 10, 12].map((size): Row => {
    const problem = randomProblem(size);
    const { medianMs, answer } = timed(() => searchOrder(problem));
    const row: Row = { name: "search an order", size, medianMs, runs: RUNS, checksum: digest(answer.kind === "found" ? Math.round(answer.weight * 1e6) : answer.kind), peakMB: peakMB() };
    if (size > 6) return row;
    const slow = timed(() => everyOrder(problem));
    return { ...row, reference: "every order tried", ratio: Math.round((slow.medianMs / Math.max(medianMs, 0.01)) * 10) / 10 };
  });
}

/** Faces against a punch at a moment and over a stroke, and what a solid modeller and a triangle-mesh library take for each such question. */
async function clearances(): Promise<readonly Row[]> {
  return (await clearanceQuestions()).flatMap(({ name, questions, clip, solids, solid, meshes, mesh }): readonly Row[] => {
    const own = timed(clip);
    const each = Math.max(own.medianMs, 0.01) / questions;
    return ([["a solid modeller", solid, solids], ["a triangle-mesh library", mesh, meshes]] as const).map(([reference, ask, sample]) => {
      const slow = timed(ask);
      return {
        name, size: questions, medianMs: own.medianMs, runs: RUNS, checksum: digest([own.answer, slow.answer]), peakMB: peakMB(),
        reference, ratio: Math.round((slow.medianMs / sample / each) * 10) / 10,
      };
    });
  });
}

/** Everything that is wrong with a part, with a small shop: a corrugated sheet, and a plate with a tab out of every tooth and a hole beside it. */
function findings(): readonly Row[] {
  const asked = [["corrugated", 10], ["corrugated", 100], ["corrugated", 500], ["comb", 10], ["comb", 100]] as const;
  return asked.map(([kind, size]): Row => {
    const document = findingParts[kind](size);
    const part = partOf(document);
    const { medianMs, answer } = timed(() => judged(document, part));
    return { name: `find what is wrong, ${kind}`, size, medianMs, runs: RUNS, checksum: digest(answer), peakMB: peakMB() };
  });
}

/** Parts from their documents to the flat, as the editor asks at each key. */
function unfolds(): readonly Row[] {
  const kinds = [["unfold a chain", corrugated], ["unfold a comb", comb], ["fold a drawn comb", (bends: number) => asFlat(comb(bends))]] as const;
  return kinds.flatMap(([name, make]) => [10, 30, 100, 500].map((size): Row => {
    const document = make(size);
    const { medianMs, answer } = timed(() => unfold(document));
    return { name, size, medianMs, runs: RUNS, checksum: digest(answer), peakMB: peakMB() };
  }));
}

/** One bed for a day's bends: the fewest stations out of the pieces there are, proven. */
function sharedBeds(): readonly Row[] {
  return [[10, 3], [30, 5], [60, 8], [100, 10]].map(([size = 0, sides = 0]): Row => {
    const { medianMs, answer } = timed(() => dayOnOneBed(dayOfBends(size, sides)));
    return { name: `one bed in ${answer.stations.length} stations, ${answer.status}`, size, medianMs, runs: RUNS, checksum: digest([answer.status, answer.stations.length, answer.kinds, answer.pieces, answer.carried]), peakMB: peakMB() };
  });
}

function withGrowth(rows: readonly Row[]): readonly Row[] {
  return rows.map((row, i) => {
    const before = rows[i - 1];
    if (before === undefined || before.name !== row.name) return row;
    return { ...row, growth: Math.round((row.medianMs / Math.max(before.medianMs, 0.01)) ** (1 / (row.size - before.size)) * 100) / 100 };
  });
}

const rows = [...withGrowth([...searches(), ...unfolds(), ...plans()]), ...findings(), ...sharedBeds(), ...await clearances()];
if (process.argv.includes("--json")) process.stdout.write(`${JSON.stringify(rows, null, 2)}\n`);
else {
  for (const row of rows) {
    const growth = row.growth === undefined ? "" : `  x ${row.growth} a bend`;
    const status = row.status === undefined ? "" : `  ${row.status}${row.gap ? `, gap ${(row.gap * 100).toFixed(1)} %` : ""}`;
    const ratio = row.ratio === undefined ? "" : `  ${row.ratio} times as fast as ${row.reference ?? ""}`;
    process.stdout.write(`${row.name.padEnd(30)} ${String(row.size).padStart(4)} ${/^cl(ip|ear)/.test(row.name) ? "asked" : "bends"} ${row.medianMs.toFixed(2).padStart(10)} ms  ${row.peakMB} MB  ${row.checksum}${status}${growth}${ratio}\n`);
  }
}
