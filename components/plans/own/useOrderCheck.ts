"use client";
import { useEffect, useRef, useState } from "react";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanFailure } from "@/bending/plan/planFailure";
import type { PlanShopView } from "@/lib/schemas/views";
import type { OrderAnswer, OrderAsk, TriedOrder } from "./orderMessages";

/** ms without a change before the time of an order is worked out. */
const RESTED_MS = 250;

export interface OrderCheck {
  /** True while the newest order is being looked over. */
  readonly looking: boolean;
  /** Where the newest order fails; null: each step can be made, or it is not known yet. */
  readonly failure: PlanFailure | null;
  /** False while other V openings than the likeliest are still being looked at. */
  readonly whole: boolean;
  /** The best plan along the order; null until it is worked out. */
  readonly plan: PlanDocument | null;
  /** True while that plan is being worked out. */
  readonly planning: boolean;
  readonly broken: boolean;
}

interface Found extends Pick<OrderCheck, "failure" | "whole" | "plan"> { readonly of: TriedOrder }

const startThread = (task: PlanShopView["task"]): Worker => {
  const thread = new Worker(new URL("./order.worker.ts", import.meta.url), { type: "module" });
  thread.postMessage({ kind: "open", task } satisfies OrderAsk);
  return thread;
};

/**
 * Looks an order over while it is being made, in two threads of the browser: one says in a moment which step fails, and is never asked anything but the
 * newest order; the other works out the best plan along an order that was left alone for a moment, and is ended when the order changes.
 */
export function useOrderCheck(task: PlanShopView["task"], tried: TriedOrder): OrderCheck {
  const [found, setFound] = useState<Found | null>(null);
  const [broken, setBroken] = useState(false);
  const trier = useRef<{ readonly ask: (tried: TriedOrder) => void } | null>(null);
  useEffect(() => {
    const thread = startThread(task);
    let asked: TriedOrder | null = null;
    let last: TriedOrder | null = null;
    let waiting: TriedOrder | null = null;
    let count = 0;
    const ask = (next: TriedOrder): void => {
      if (asked !== null) { waiting = next; return; }
      asked = next;
      thread.postMessage({ kind: "try", id: (count += 1), tried: next } satisfies OrderAsk);
    };
    thread.onmessage = ({ data }: MessageEvent<OrderAnswer>) => {
      if (data.kind !== "tried" || data.id !== count) return;
      last = asked ?? last;
      asked = null;
      if (waiting !== null) {
        const next = waiting;
        waiting = null;
        ask(next);
      } else if (last !== null) setFound({ of: last, failure: data.failure, whole: data.whole, plan: null });
    };
    thread.onerror = () => setBroken(true);
    trier.current = { ask };
    return () => { trier.current = null; thread.terminate(); };
  }, [task]);
  useEffect(() => { trier.current?.ask(tried); }, [task, tried]);
  const works = found !== null && found.of === tried && found.failure === null;
  useEffect(() => {
    if (!works) return undefined;
    let thread: Worker | null = null;
    const timer = setTimeout(() => {
      thread = startThread(task);
      thread.onmessage = ({ data }: MessageEvent<OrderAnswer>) => {
        if (data.kind === "planned") setFound({ of: tried, failure: null, whole: true, plan: data.plan });
        thread?.terminate();
      };
      thread.onerror = () => setBroken(true);
      thread.postMessage({ kind: "plan", id: 1, tried } satisfies OrderAsk);
    }, RESTED_MS);
    return () => { clearTimeout(timer); thread?.terminate(); };
  }, [task, tried, works]);
  const newest = found !== null && found.of === tried ? found : null;
  return { looking: newest === null, failure: newest?.failure ?? null, whole: newest?.whole ?? false, plan: newest?.plan ?? null, planning: works && newest?.plan === null, broken };
}
