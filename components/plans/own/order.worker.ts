import { checkOrder } from "@/bending/plan/checkOrder";
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

/** The newest order that was asked about. */
let newest = 0;

/** The ground with the likeliest flat alone: what works on it is not asked of the others. */
const likeliest = (ground: Ground): Ground => ({ ...ground, flat: (index) => (index === 0 ? ground.flat(0) : undefined) });

function groundFor(request: CheckRequest): Ground {
  const wishes = JSON.stringify(request.wishes);
  if (kept?.wishes !== wishes) {
    kept = { wishes, ground: createGround(request) };
    workAhead(kept.ground, 0);
  }
  return kept.ground;
}

/** Says at once whether it works on the likeliest V; where it does not, whether it does on any, unless another order is asked about meanwhile. */
function tryOrder(id: number, request: CheckRequest, say: (answer: OrderAnswer) => void): void {
  newest = id;
  const ground = groundFor(request);
  const failure = firstFailure(request, undefined, likeliest(ground));
  say({ kind: "tried", id, failure, whole: failure === null });
  if (failure !== null) setTimeout(() => { if (newest === id) say({ kind: "tried", id, failure: firstFailure(request, undefined, ground), whole: true }); });
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
  else if (open !== null && data.kind === "try") tryOrder(data.id, requestOf(open, data.tried), say);
  else if (open !== null) say({ kind: "planned", id: data.id, plan: checkOrder(requestOf(open, data.tried)) });
};
