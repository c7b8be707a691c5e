"use client";
import { useEffect } from "react";

/** Gives the graphics card's memory back when the thing is replaced or the view closes. */
export function useDispose(made: { dispose: () => void }): void {
  useEffect(() => () => made.dispose(), [made]);
}
