import { request, type APIRequestContext } from "@playwright/test";
import type { MachineView, PartDetail, PlanDetail, PlanJobView, SheetListItem } from "../../../lib/schemas/views";
import { demonstrationPassword } from "../../../seeds/shop/demonstrationPassword";
import { emailOf } from "./emailOf";
import { channelLegs } from "./typeChannel";

export interface ReleasedChannel {
  readonly part: string;
  readonly plan: string;
  readonly sheet: string;
  /** The punch of its first step. */
  readonly tool: string;
}

const bends = channelLegs.slice(1).map(() => ({ angle: 90, direction: "up" }));
const document = { format: "part/1", name: "Channel to look at", units: "mm", material: "S235", thickness: 2, profile: { width: 240, legs: channelLegs, bends } };

async function answer<T>(response: Awaited<ReturnType<APIRequestContext["get"]>>): Promise<T> {
  if (!response.ok()) throw new Error(`${response.url()} answered ${response.status()}: ${await response.text()}`);
  return (await response.json()) as T;
}

/** A channel with a plan and a released sheet, made by an engineer over the API. */
export async function releasedChannel(baseURL: string): Promise<ReleasedChannel> {
  const engineer = await request.newContext({ baseURL });
  try {
    const { csrfToken } = await answer<{ csrfToken: string }>(await engineer.get("/api/auth/csrf"));
    await answer(await engineer.post("/api/auth/callback/credentials", { form: { email: emailOf("engineer"), password: demonstrationPassword, csrfToken, json: "true" } }));
    const part = await answer<PartDetail>(await engineer.post("/api/parts", { data: { document } }));
    const [machine] = await answer<readonly MachineView[]>(await engineer.get("/api/machines"));
    if (!machine) throw new Error("the demonstration shop has no brake");
    let job = await answer<PlanJobView>(await engineer.post("/api/plans", { data: { partId: part.id, machineId: machine.id, batch: 25 } }));
    while (job.state === "running") {
      await new Promise((resolve) => setTimeout(resolve, 250));
      job = await answer<PlanJobView>(await engineer.get(`/api/plan-jobs/${job.id}`));
    }
    if (job.planId === null) throw new Error(`no plan: ${job.message}`);
    const { plan } = await answer<PlanDetail>(await engineer.get(`/api/plans/${job.planId}`));
    const sheet = await answer<SheetListItem>(await engineer.post(`/api/plans/${job.planId}/sheets`, { data: {} }));
    await answer(await engineer.post(`/api/sheets/${sheet.id}/release`, { data: {} }));
    return { part: part.id, plan: job.planId, sheet: sheet.id, tool: plan.steps[0]?.punch ?? "" };
  } finally {
    await engineer.dispose();
  }
}
