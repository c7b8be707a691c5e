"use client";
import { useMemo, useState } from "react";
import type { BendWish } from "@/bending/plan/bendWish";
import type { TriedOrder } from "./orderMessages";

export interface OwnOrder extends TriedOrder {
  readonly mayUndo: boolean;
  readonly mayRedo: boolean;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly startOver: () => void;
  /** Shows an order that is not settled yet (while a step is dragged); null goes back to the settled one. */
  readonly preview: (order: readonly string[] | null) => void;
  /** Settles an order, to be undone. */
  readonly settle: (order: readonly string[]) => void;
  /** Asks something of the bends of a stroke; undefined takes a wish back. */
  readonly wish: (entry: string, changes: { readonly [Key in "front" | "punch" | "die"]?: string | undefined }) => void;
}

/** A person's own order with a history, and the order that is being dragged before it is settled. */
export function useOwnOrder(start: TriedOrder): OwnOrder {
  const [history, setHistory] = useState<{ readonly all: readonly TriedOrder[]; readonly at: number }>({ all: [start], at: 0 });
  const [dragged, setDragged] = useState<readonly string[] | null>(null);
  const settled = history.all[history.at] ?? start;
  const shown = useMemo<TriedOrder>(() => (dragged === null ? settled : { ...settled, order: dragged }), [settled, dragged]);
  const push = (next: TriedOrder): void => {
    setDragged(null);
    if (JSON.stringify(next) === JSON.stringify(settled)) return;
    setHistory({ all: [...history.all.slice(0, history.at + 1), next], at: history.at + 1 });
  };
  const go = (by: number): void => {
    setDragged(null);
    setHistory({ ...history, at: Math.min(history.all.length - 1, Math.max(0, history.at + by)) });
  };
  return {
    ...shown,
    mayUndo: history.at > 0,
    mayRedo: history.at + 1 < history.all.length,
    undo: () => go(-1),
    redo: () => go(1),
    startOver: () => push(start),
    preview: setDragged,
    settle: (order) => push({ ...settled, order }),
    wish: (entry, changes) => {
      const bends = entry.split("+");
      const others = settled.wishes.filter(({ bend }) => !bends.includes(bend));
      const changed = bends.flatMap((bend): readonly BendWish[] => {
        const merged = { ...settled.wishes.find((one) => one.bend === bend), ...changes };
        const kept = Object.fromEntries(Object.entries(merged).filter(([key, value]) => key !== "bend" && value !== undefined));
        return Object.keys(kept).length === 0 ? [] : [{ bend, ...kept }];
      });
      push({ ...settled, wishes: [...others, ...changed] });
    },
  };
}
