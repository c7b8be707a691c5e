import type { z } from "zod";
import { loadValues } from "../bendTable/loadValues";
import { getShopSettings } from "../settings/getShopSettings";
import { fail, ok, type Result } from "@/bending/core/result";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import type { Connection } from "@/db/connection";
import { findMachine } from "@/db/machines/findMachine";
import { findMaterial } from "@/db/materials/findMaterial";
import { findPart } from "@/db/parts/findPart";
import { findToolsInService } from "@/db/tools/findToolsInService";
import type { Failure } from "@/lib/api/failure";
import type { PlanTask } from "@/lib/jobs/planTask";
import type { startPlanSchema } from "@/lib/schemas/planInputs";

const SEARCH_LIMIT_MS = 60_000;
const ALTERNATIVES = 3;

export interface PlanInputs {
  readonly partId: string;
  readonly revisionId: string;
  readonly machineId: string;
  readonly machineDocument: unknown;
  readonly materialVersionId: string;
  /** For the record: "P-1001 rev 2 on Brake 1". */
  readonly subject: string;
  readonly task: PlanTask;
}

/** Gathers what a plan is made from, as it is now: the revision, the machine, the tools in service, the shop's measured values. */
export async function planInputs(db: Connection, input: z.output<typeof startPlanSchema>): Promise<Result<PlanInputs, Failure>> {
  const found = await findPart(db, input.partId, input.revision);
  if (!found) return refuse(input.revision === undefined ? "partId" : "revision", "There is no such part or revision (any more).");
  const row = await findMachine(db, input.machineId);
  if (!row) return refuse("machineId", "There is no such machine (any more).");
  const machine = readMachineDocument(row.document);
  if (!machine.ok) return refuse("machineId", `The machine ${row.name} cannot be used: ${machine.error.map(({ path, message }) => `${path} ${message}`).join("; ")}.`);
  const { document } = found.revision;
  const material = await findMaterial(db, document.material);
  if (!material) return refuse("partId", `The material ${document.material} of the part is not known to the shop.`);
  const table = await loadValues(db, document.material);
  const tools = await findToolsInService(db);
  const { forceFactors } = await getShopSettings();
  if (tools.length === 0) return fail({ kind: "conflict", message: "No tool has a piece in service, so nothing can be planned. The toolroom enters tools." });
  return ok({
    partId: found.part.id,
    revisionId: found.revision.id,
    machineId: row.id,
    machineDocument: row.document,
    materialVersionId: material.version_id,
    subject: `${found.part.number} rev ${found.revision.revision} on ${row.name}`,
    task: { document, material: material.facts, ...(table.cells.length > 0 ? { shopTable: table } : {}), tools, machine: machine.value, batch: input.batch, ...(forceFactors.air === 1 ? {} : { airForceFactor: forceFactors.air }), alternatives: ALTERNATIVES, limitMs: SEARCH_LIMIT_MS },
  });
}

const refuse = (path: string, message: string) => fail<Failure>({ kind: "invalid", message, errors: [{ path, message }] });
