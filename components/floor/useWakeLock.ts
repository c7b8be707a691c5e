"use client";
import { useEffect } from "react";

/** Keeps the screen awake while it is in view, where the browser can. */
export function useWakeLock(): void {
  useEffect(() => {
    let lock: WakeLockSentinel | null = null;
    let gone = false;
    const hold = async (): Promise<void> => {
      if (document.visibilityState !== "visible" || !("wakeLock" in navigator)) return;
      const held = await navigator.wakeLock.request("screen").catch(() => null);
      if (gone) await held?.release();
      else lock = held;
    };
    const look = (): void => void hold();
    look();
    document.addEventListener("visibilitychange", look);
    return () => {
      gone = true;
      document.removeEventListener("visibilitychange", look);
      void lock?.release();
    };
  }, []);
}
