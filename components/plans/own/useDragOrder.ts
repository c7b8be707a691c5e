"use client";
import { useRef, useState, type PointerEvent } from "react";

export interface DragOrder {
  /** The entry that is held; null: none. */
  readonly held: string | null;
  readonly rowRef: (entry: string) => (row: HTMLElement | null) => void;
  readonly grip: (entry: string) => { readonly onPointerDown: (event: PointerEvent<HTMLElement>) => void; readonly onPointerMove: (event: PointerEvent<HTMLElement>) => void; readonly onPointerUp: () => void; readonly onPointerCancel: () => void };
}

/** Dragging a row of a list: the order as it would be is shown while the pointer moves, and settled when it lets go. */
export function useDragOrder(order: readonly string[], preview: (order: readonly string[] | null) => void, settle: (order: readonly string[]) => void): DragOrder {
  const [held, setHeld] = useState<string | null>(null);
  const rows = useRef(new Map<string, HTMLElement>());
  const end = (keep: boolean): void => {
    if (held === null) return;
    setHeld(null);
    if (keep) settle(order);
    else preview(null);
  };
  return {
    held,
    rowRef: (entry) => (row) => {
      if (row) rows.current.set(entry, row);
      else rows.current.delete(entry);
    },
    grip: (entry) => ({
      onPointerDown: (event) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        setHeld(entry);
      },
      onPointerMove: (event) => {
        if (held !== entry) return;
        const others = order.filter((one) => one !== entry);
        const above = others.filter((one) => {
          const box = rows.current.get(one)?.getBoundingClientRect();
          return box !== undefined && box.top + box.height / 2 < event.clientY;
        }).length;
        const moved = [...others.slice(0, above), entry, ...others.slice(above)];
        if (moved.some((one, index) => one !== order[index])) preview(moved);
      },
      onPointerUp: () => end(true),
      onPointerCancel: () => end(false),
    }),
  };
}
