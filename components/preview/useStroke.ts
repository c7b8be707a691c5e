"use client";
import { useEffect, useEffectEvent, useState } from "react";

/** Bent, before springing back: what a step is shown at when it is chosen. */
const CHOSEN_AT = 0.8;
const STROKE_SECONDS = 4;

export interface Stroke {
  readonly at: number;
  readonly playing: boolean;
  readonly scrub: (at: number) => void;
  readonly toggle: () => void;
}

/** The place on the stroke's slider, and playing it through, step after step. */
export function useStroke(step: number, steps: number, onStep: (step: number) => void): Stroke {
  const [at, setAt] = useState(CHOSEN_AT);
  const [playing, setPlaying] = useState(false);
  const [shown, setShown] = useState(step);
  if (shown !== step) {
    setShown(step);
    setAt(playing ? 0 : CHOSEN_AT);
  }
  const tick = useEffectEvent((seconds: number) => {
    const next = at + seconds / STROKE_SECONDS;
    if (next < 1) setAt(next);
    else if (step + 1 < steps) onStep(step + 1);
    else {
      setAt(1);
      setPlaying(false);
    }
  });
  useEffect(() => {
    if (!playing) return undefined;
    let last = performance.now();
    let frame = requestAnimationFrame(function draw(now) {
      tick(Math.min(0.2, (now - last) / 1000));
      last = now;
      frame = requestAnimationFrame(draw);
    });
    return () => cancelAnimationFrame(frame);
  }, [playing]);
  const toggle = (): void => {
    if (!playing && at >= 0.99) setAt(0);
    setPlaying(!playing);
  };
  const scrub = (to: number): void => {
    setPlaying(false);
    setAt(Math.min(1, Math.max(0, to)));
  };
  return { at, playing, scrub, toggle };
}
