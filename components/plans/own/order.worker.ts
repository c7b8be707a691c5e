import { checkOrder } from "@/bending/plan/checkOrder";
import type { CheckRequest } from "@/bending/plan/planRequest";
import { firstFailure } from "@/bending/whyNot/firstFailure";
import type { PlanShopView } from "@/lib/schemas/views";
import type { OrderAnswer, OrderAsk, TriedOrder } from "./orderMessages";

/** How long the time that an order takes is looked for here; the server takes as long as it is given. */
const LONGEST_MS = 10_000;

let open: PlanShopView["task"] | null = null;

function requestOf(task: PlanShopView["task"], { order, wishes }: TriedOrder): CheckRequest {
  const { document, material, shopTable, tools, machine, batch, airForceFactor } = task;
  const until = performance.now() + LONGEST_MS;
  return {
    document, tools, machine, batch, order, wishes,
    materials: (id) => (id === material.id ? material : undefined),
    shouldStop: () => performance.now() > until,
    ...(shopTable === undefined ? {} : { shopTable }),
    ...(airForceFactor === undefined ? {} : { airForceFactor }),
  };
}

self.onmessage = ({ data }: MessageEvent<OrderAsk>) => {
  const say = (answer: OrderAnswer) => self.postMessage(answer);
  if (data.kind === "open") open = data.task;
  else if (open !== null && data.kind === "try") say({ kind: "tried", id: data.id, failure: firstFailure(requestOf(open, data.tried)) });
  else if (open !== null) say({ kind: "planned", id: data.id, plan: checkOrder(requestOf(open, data.tried)) });
};
