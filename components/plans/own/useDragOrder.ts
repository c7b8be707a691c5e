"use client";
import { useEffect, useEffectEvent, useRef, useState, type PointerEvent } from "react";

export interface DragOrder {
  /** The entry that is held; null: none. */
  readonly held: string | null;
  readonly rowRef: (entry: string) => (row: HTMLElement | null) => void;
  readonly grip: (entry: string) => { readonly onPointerDown: (event: PointerEvent<HTMLElement>) => void };
}

/**
 * Dragging a row of a list: the order as it would be is shown while the pointer moves, and settled when it lets go; Escape takes it back. The
 * pointer is followed over the whole window: a row that changes its place loses a pointer that it had caught.
 */
export function useDragOrder(order: readonly string[], preview: (order: readonly string[] | null) => void, settle: (order: readonly string[]) => void): DragOrder {
  const [held, setHeld] = useState<string | null>(null);
  const rows = useRef(new Map<string, HTMLElement>());
  const follow = useEffectEvent((clientY: number) => {
    if (held === null) return;
    const others = order.filter((one) => one !== held);
    const above = others.filter((one) => {
      const box = rows.current.get(one)?.getBoundingClientRect();
      return box !== undefined && box.top + box.height / 2 < clientY;
    }).length;
    const next = [...others.slice(0, above), held, ...others.slice(above)];
    if (next.some((one, index) => one !== order[index])) preview(next);
  });
  const end = useEffectEvent((keep: boolean) => {
    setHeld(null);
    if (keep) settle(order);
    else preview(null);
  });
  const dragging = held !== null;
  useEffect(() => {
    if (!dragging) return undefined;
    const listening = new AbortController();
    const { signal } = listening;
    window.addEventListener("pointermove", (event) => follow(event.clientY), { signal });
    window.addEventListener("pointerup", () => end(true), { signal });
    window.addEventListener("pointercancel", () => end(false), { signal });
    window.addEventListener("keydown", (event) => { if (event.key === "Escape") end(false); }, { signal });
    return () => listening.abort();
  }, [dragging]);
  return {
    held,
    rowRef: (entry) => (row) => {
      if (row) rows.current.set(entry, row);
      else rows.current.delete(entry);
    },
    grip: (entry) => ({
      onPointerDown: (event) => {
        if (event.button !== 0) return;
        if (event.currentTarget.hasPointerCapture(event.pointerId)) event.currentTarget.releasePointerCapture(event.pointerId);
        setHeld(entry);
      },
    }),
  };
}
