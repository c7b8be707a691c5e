import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanFailure } from "@/bending/plan/planFailure";
import type { CheckRequest } from "@/bending/plan/planRequest";
import { createGround, type Ground } from "@/bending/whyNot/createGround";
import { firstFailure } from "@/bending/whyNot/firstFailure";
import type { PlanShopView } from "@/lib/schemas/views";
import type { OrderAnswer, OrderAsk, TriedOrder } from "./orderMessages";

/** How long the time that an order takes is looked for here; the server takes as long as it is given. */
const LONGEST_MS = 10_000;

let open: PlanShopView["task"] | null = null;
/** What was worked out for an order helps with the next, as long as the same is asked of the bends. */
let kept: { readonly wishes: string; readonly ground: Ground } | null = null;

function failureOf(request: CheckRequest): PlanFailure | null {
  const wishes = JSON.stringify(request.wishes);
  if (kept?.wishes !== wishes) {
    kept = { wishes, ground: createGround(request) };
    workAhead(kept.ground, 0);
  }
  return firstFailure(request, undefined, kept.ground);
}

/** Works out the flats that the last order did not need, one at a time, so that questions come between; the next order has them then. */
function workAhead(ground: Ground, index: number): void {
  setTimeout(() => {
    if (kept?.ground === ground && ground.flat(index) !== undefined) workAhead(ground, index + 1);
  });
}

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
  if (data.kind === "open") {
    open = data.task;
    kept = null;
  }
  else if (open !== null && data.kind === "try") say({ kind: "tried", id: data.id, failure: failureOf(requestOf(open, data.tried)) });
  else if (open !== null) say({ kind: "planned", id: data.id, plan: checkOrder(requestOf(open, data.tried)) });
};
