"use client";
import { useEffect, useRef, useState } from "react";
import type { ImportChoices } from "@/bending/exchange/dxf/import/importChoices";
import type { DrawingAnswer, DrawingAsk, DrawingFacts } from "./drawingMessages";

/** Longer than any flat takes; then the file is stopped and the page stays alive. */
const LONGEST_MS = 20_000;
const MOST_BYTES = 50_000_000;

export type FoundDrawing = Extract<DrawingAnswer, { readonly kind: "found" }>;

export interface DrawingState {
  readonly facts: DrawingFacts | null;
  readonly found: FoundDrawing | null;
  readonly failed: string | null;
}

/**
 * A file read in a thread of its own, so that neither size nor damage stops the page. Nothing leaves the browser until the part is saved.
 * `choices` null: not yet chosen.
 */
export function useDrawing(file: File, choices: ImportChoices | null): DrawingState {
  const [state, setState] = useState<DrawingState>({ facts: null, found: null, failed: null });
  const worker = useRef<{ readonly ask: (ask: DrawingAsk, transfer?: ArrayBuffer[]) => void } | null>(null);
  const count = useRef(0);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const thread = new Worker(new URL("./drawing.worker.ts", import.meta.url), { type: "module" });
    const fail = (failed: string) => { clearTimeout(timer); thread.terminate(); setState((old) => ({ ...old, failed })); };
    thread.onmessage = ({ data }: MessageEvent<DrawingAnswer>) => {
      // Only the answer to the newest question counts.
      if (data.id !== count.current) return;
      clearTimeout(timer);
      if (data.kind === "failed") fail(data.message);
      else if (data.kind === "opened") setState({ facts: data.facts, found: null, failed: null });
      else setState((old) => ({ ...old, found: data }));
    };
    thread.onerror = () => fail("it cannot be read here: the browser gave up on it");
    worker.current = {
      ask: (ask, transfer = []) => {
        clearTimeout(timer);
        timer = setTimeout(() => fail(`reading took longer than ${LONGEST_MS / 1000} s and was stopped; save the flat alone, without other views and frames`), LONGEST_MS);
        thread.postMessage(ask, transfer);
      },
    };
    if (file.size > MOST_BYTES) fail(`it has ${(file.size / 1e6).toFixed(1)} MB; at most ${MOST_BYTES / 1e6} MB are read`);
    else void file.arrayBuffer().then((bytes) => worker.current?.ask({ id: (count.current += 1), kind: "open", bytes }, [bytes]), () => fail("it cannot be read from the disk any more; choose it again"));
    return () => { clearTimeout(timer); worker.current = null; thread.terminate(); };
  }, [file]);
  const ready = state.facts !== null;
  useEffect(() => {
    if (ready && choices !== null) worker.current?.ask({ id: (count.current += 1), kind: "find", choices });
  }, [ready, choices]);
  return state;
}
