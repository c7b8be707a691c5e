"use client";
import { useEffect, useEffectEvent } from "react";

interface Steps {
  readonly undo: (() => void) | null;
  readonly redo: (() => void) | null;
  readonly save: () => void;
}

/**
 * Ctrl+Z (or Cmd+Z) takes the last change back, with Shift or by Ctrl+Y it comes again, Ctrl+S saves; in a dialog the keys
 * stay the browser's.
 */
export function useEditorKeys({ undo, redo, save }: Steps): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    const key = event.key.toLowerCase();
    const again = key === "y" || (key === "z" && event.shiftKey);
    const step = key === "s" ? save : again ? redo : key === "z" ? undo : undefined;
    if (!(event.ctrlKey || event.metaKey) || event.altKey || step === undefined) return;
    if (event.target instanceof Element && event.target.closest("[role=dialog]") !== null) return;
    event.preventDefault();
    step?.();
  });
  useEffect(() => {
    const listen = (event: KeyboardEvent) => press(event);
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, []);
}
