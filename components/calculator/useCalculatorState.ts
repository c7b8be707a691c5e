"use client";
import { useCallback, useEffect, useEffectEvent, useState } from "react";
import type { ChoiceKey } from "@/lib/calculator/choices";
import { fieldKeys, fieldOf, type FieldKey } from "@/lib/calculator/fields";
import { keepUnit } from "@/lib/calculator/keepUnit";
import { readState, writeState, type CalculatorState } from "@/lib/calculator/stateInAddress";

const PATH = "/calculator";
const KEPT = "calculator";

/** What was entered: out of the address, else as it was left in this window; reloaded, as it was left, which the address may lag behind. */
function start(): CalculatorState {
  const [kept, asked] = [window.sessionStorage.getItem(KEPT), window.location.search.slice(1)];
  return readState(asked === "" || (reloaded() && kept !== null) ? (kept ?? "") : asked);
}

/** Only the page's first loading counts: later visits in the same window come by a link. */
function reloaded(): boolean {
  const [entry] = performance.getEntriesByType("navigation");
  return entry instanceof PerformanceNavigationTiming && entry.type === "reload" && new URL(entry.name).search === window.location.search;
}

/** Puts the state into the address, so that reload, back and a copied link bring it again; not once the page has been left. */
function putInAddress(state: CalculatorState): void {
  const query = writeState(state);
  const { pathname, search, hash } = window.location;
  if (pathname !== PATH || search === (query === "" ? "" : `?${query}`)) return;
  window.history.replaceState(window.history.state, "", `${PATH}${query === "" ? "" : `?${query}`}${hash}`);
}

/** The entries of the calculator, kept in the address and for as long as the window is open. */
export function useCalculatorState() {
  const [state, setState] = useState(start);
  useEffect(() => {
    window.sessionStorage.setItem(KEPT, writeState(state));
    const timer = setTimeout(() => putInAddress(state), 300);
    return () => clearTimeout(timer);
  }, [state]);
  const again = useEffectEvent(() => putInAddress(state));
  useEffect(() => {
    const onBack = () => setTimeout(again);
    window.addEventListener("popstate", onBack);
    return () => window.removeEventListener("popstate", onBack);
  }, []);
  const setText = useCallback((key: FieldKey, text: string) => setState((old) => ({ ...old, texts: { ...old.texts, [key]: text } })), []);
  const setMaterial = useCallback((material: string) => setState((old) => ({ ...old, material })), []);
  const choose = useCallback((key: ChoiceKey, value: string) => setState((old) => (key === "u" ? inUnits(old, value === "in" ? "in" : "mm") : { ...old, choices: { ...old.choices, [key]: value } })), []);
  const clear = useCallback(() => setState((old) => ({ ...readState(""), choices: { ...readState("").choices, u: old.choices.u } })), []);
  return { state, setText, setMaterial, choose, clear };
}

function inUnits(old: CalculatorState, units: "mm" | "in"): CalculatorState {
  if (units === old.choices.u) return old;
  const texts = Object.fromEntries(fieldKeys.flatMap((key) => {
    const kept = keepUnit(old.texts[key] ?? fieldOf(key).start, fieldOf(key).kind, old.choices.u);
    return kept === fieldOf(key).start ? [] : [[key, kept]];
  }));
  return { ...old, texts, choices: { ...old.choices, u: units } };
}
