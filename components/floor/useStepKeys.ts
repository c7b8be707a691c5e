"use client";
import { useEffect, useEffectEvent } from "react";

const onwards = new Set(["ArrowRight", " ", "PageDown", "Enter"]);
const backwards = new Set(["ArrowLeft", "PageUp", "Backspace"]);

/** Next and back by keys (or a foot switch that types one), unless a control wants the key for itself. */
export function useStepKeys(next: () => void, back: () => void): void {
  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
    const target = event.target instanceof Element ? event.target : null;
    if (target?.closest("input, select, textarea, [role=slider]")) return;
    if ((event.key === " " || event.key === "Enter") && target?.closest("button, a")) return;
    if (onwards.has(event.key)) next();
    else if (backwards.has(event.key)) back();
    else return;
    event.preventDefault();
  });
  useEffect(() => {
    const listen = (event: KeyboardEvent): void => onKey(event);
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, []);
}
