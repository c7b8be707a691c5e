"use client";
import { useSyncExternalStore } from "react";
import { hasWebGl } from "./hasWebGl";

const never = (): (() => void) => () => undefined;

/** Null until the browser is known. */
export const useHasWebGl = (): boolean | null => useSyncExternalStore<boolean | null>(never, hasWebGl, () => null);
