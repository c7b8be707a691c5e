import type { z } from "zod";
import { loadValues } from "../bendTable/loadValues";
import { getShopSettings } from "../settings/getShopSettings";
import type { PlanAsked } from "./planAsked";
import { fail, ok, type Result } from "@/bending/core/result";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import type { Connection } from "@/db/connection";
import { findMachine } from "@/db/machines/findMachine";
import { findMaterial } from "@/db/materials/findMaterial";
import { findPart } from "@/db/parts/findPart";
import { findToolsInService } from "@/db/tools/findToolsInService";
import type { Failure } from "@/lib/api/failure";
import type { PlanTask } from "@/lib/jobs/planTask";
import { planAlternatives, planTimeLimit, type startPlanSchema } from "@/lib/schemas/planInputs";

/** What is asked for: a part on a machine, in whose time, and perhaps along a person's own order. */
export interface PlanQuestion extends z.output<typeof startPlanSchema>, Pick<PlanAsked, "order" | "wishes"> {}

export interface PlanInputs {
  readonly partId: string;
  readonly revisionId: string;
  readonly machineId: string;
  readonly machineDocument: unknown;
  readonly materialVersionId: string;
  /** For the record: "P-1001 rev 2 on Brake 1". */
  readonly subject: string;
  readonly task: PlanTask;
  readonly asked: PlanAsked;
}

/** Gathers what a plan is made from, as it is now: the revision, the machine, the tools in service that are not promised to another brake, the shop's measured values. */
export async function planInputs(db: Connection, input: PlanQuestion): Promise<Result<PlanInputs, Failure>> {
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
  const tools = await findToolsInService(db, input.otherBrakes === true ? {} : { at: row.id });
  const { forceFactors } = await getShopSettings();
  if (tools.length === 0) return fail({ kind: "conflict", message: "No tool has a piece in service, so nothing can be planned. The toolroom enters tools." });
  const asked = askedOf(input);
  return ok({
    partId: found.part.id,
    revisionId: found.revision.id,
    machineId: row.id,
    machineDocument: row.document,
    materialVersionId: material.version_id,
    subject: `${found.part.number} rev ${found.revision.revision} on ${row.name}`,
    task: {
      document, material: material.facts, tools, machine: machine.value, batch: input.batch, alternatives: asked.alternatives, limitMs: Math.round((input.limitSeconds ?? planTimeLimit.usual) * 1000),
      ...(table.cells.length > 0 ? { shopTable: table } : {}),
      ...(forceFactors.air === 1 ? {} : { airForceFactor: forceFactors.air }),
      ...(asked.order ? { order: asked.order } : {}),
      ...(asked.wishes ? { wishes: asked.wishes } : {}),
    },
    asked,
  });
}

const askedOf = ({ alternatives, otherBrakes, order, wishes }: PlanQuestion): PlanAsked => ({
  alternatives: alternatives ?? planAlternatives.usual, otherBrakes: otherBrakes ?? false, ...(order ? { order } : {}), ...(wishes && wishes.length > 0 ? { wishes } : {}),
});

const refuse = (path: string, message: string) => fail<Failure>({ kind: "invalid", message, errors: [{ path, message }] });
