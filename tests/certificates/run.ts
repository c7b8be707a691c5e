import { readFileSync } from "node:fs";
import { materialById } from "@/bending/handbook/materials";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { planPart } from "@/bending/plan/planPart";
import type { PlanRequest } from "@/bending/plan/planRequest";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { verifyPlan } from "../corpus/verifyPlan";
import { checkCertificate } from "./checkCertificate";
import { makeCertificate } from "./makeCertificate";

/**
 * npx tsx tests/certificates/run.ts PART TOOLING MACHINE [BATCH]
 *
 * Plans a part, proves the bound with a certificate of its own, puts every fact of it to the geometry, looks the plan over, and prints what came out as
 * JSON. Exit code 0: everything holds; 1: something does not; 2: a document cannot be read. Minutes for parts of more than eight bends.
 */
function main([part, tooling, machine, batch = "20"]: readonly string[]): number {
  if (!part || !tooling || !machine) return complain("usage: npx tsx tests/certificates/run.ts PART TOOLING MACHINE [BATCH]");
  const [document, tools, brake] = [readPartDocument(json(part)), readToolingDocument(json(tooling)), readMachineDocument(json(machine))];
  if (!document.ok || !tools.ok || !brake.ok) return complain([document, tools, brake].flatMap((read) => (read.ok ? [] : read.error.map(({ path, message }) => `${path}: ${message}`))).join("\n"));
  const request: PlanRequest = { document: document.value, materials: materialById, tools: tools.value, machine: brake.value, batch: Number(batch) };
  const plan = planPart(request);
  const certificate = makeCertificate(request);
  const checked = checkCertificate(certificate, request);
  const planWrong = plan.steps.length > 0 ? verifyPlan(plan, request) : [];
  const agree = plan.status === "infeasible" ? checked.bound === null : checked.bound !== null && (plan.steps.length === 0 || checked.bound <= plan.cost + 1e-4 || plan.cautions.length > 0);
  const wrong = [...planWrong, ...checked.wrong, ...(agree ? [] : [`the plan is ${plan.status} at ${plan.cost} s, the certificate says ${checked.bound}`])];
  process.stdout.write(`${JSON.stringify({ status: plan.status, order: plan.order, cost: plan.cost, planBound: plan.proof.bound, ...checked, wrong }, null, 2)}\n`);
  return wrong.length === 0 ? 0 : 1;
}

const json = (path: string): unknown => JSON.parse(readFileSync(path, "utf8"));

function complain(text: string): number {
  process.stderr.write(`${text}\n`);
  return 2;
}

process.exitCode = main(process.argv.slice(2));
