import { readdirSync, readFileSync } from "node:fs";
import { mm } from "@/bending/core/units";
import { readPartDocument } from "@/bending/part/readPartDocument";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import type { Tool } from "@/bending/tooling/tool";
import { planCorpus } from "./planCorpus";

/** A known case of the shop: a part, what is asked of it with which tools, and what must come out, worked out by hand in `why`. */
export interface PlanCase {
  readonly name: string;
  readonly why: string;
  readonly source: string;
  readonly part: unknown;
  readonly asked: readonly AskedPlan[];
}

export interface AskedPlan {
  readonly say: string;
  readonly batch?: number;
  /** Another part than the case's. */
  readonly part?: unknown;
  /** Ids of tools in service; all of the corpus unless said. */
  readonly tools?: readonly string[];
  /** Lengths of the pieces in service by tool, mm; `all` for every other tool. */
  readonly pieces?: Readonly<Record<string, readonly number[]>>;
  readonly machine?: Partial<Pick<PlanRequest["machine"], "betweenFrames" | "throatDepth">>;
  readonly oneGaugeDepth?: boolean;
  readonly expect: {
    readonly status: "optimal" | "infeasible";
    readonly stations?: number;
    readonly secondsPerPart?: number;
    /** Pairs of bends: the first is made before the second. */
    readonly before?: readonly (readonly [string, string])[];
    /** By bend. */
    readonly punch?: Readonly<Record<string, string>>;
    readonly front?: Readonly<Record<string, string>>;
    /** mm, by bend: the punch over it is no longer than this. */
    readonly punchAtMost?: Readonly<Record<string, number>>;
    /** Bends whose two fingers stand at two depths. */
    readonly slanted?: readonly string[];
    /** By bend: how many fingers hold it. */
    readonly fingers?: Readonly<Record<string, number>>;
    /** Kinds that every reason has one of. */
    readonly reasons?: readonly string[];
    /** What some reason says. */
    readonly says?: string;
    /** Orders that can be made, and orders that cannot. */
    readonly works?: readonly string[];
    readonly fails?: readonly string[];
  };
}

const folder = new URL("plans/cases/", import.meta.url);
const json = (url: URL): unknown => JSON.parse(readFileSync(url, "utf8"));

export const planCases = (): readonly PlanCase[] => readdirSync(folder).filter((file) => file.endsWith(".json")).sort().map((file) => ({ ...(json(new URL(file, folder)) as PlanCase), name: file.replace(".json", "") }));

/** The request that a case asks: the corpus's brake and tools, and the acute ones, changed as it says. */
export function askedRequest(one: PlanCase, asked: AskedPlan): PlanRequest {
  const request = planCorpus("u", asked.batch ?? 20);
  const document = readPartDocument(asked.part ?? one.part);
  const acute = readToolingDocument(json(new URL("plans/acute-tooling.json", import.meta.url)));
  if (!document.ok || !acute.ok) throw new Error(`${one.name}: ${JSON.stringify([document, acute])}`);
  const tools = [...request.tools, ...acute.value].filter(({ id }) => asked.tools?.includes(id) ?? true).map((tool) => withPieces(tool, asked.pieces?.[tool.id] ?? asked.pieces?.all));
  const gauge = { ...request.machine.gauge, ...(asked.oneGaugeDepth ? { independent: false } : {}) };
  return { ...request, document: document.value, tools, machine: { ...request.machine, ...asked.machine, gauge } };
}

function withPieces(tool: Tool, lengths: readonly number[] | undefined): Tool {
  if (lengths === undefined) return tool;
  return { ...tool, pieces: [...lengths].sort((a, b) => b - a).map((length, i) => ({ id: `${tool.id}/${i + 1}`, length: mm(length), horn: null, rack: null })) };
}
