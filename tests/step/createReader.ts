import { join } from "node:path";
import type { Worker } from "node:worker_threads";
import { startWithTsx } from "./startWithTsx";

export interface ReadingAnswer {
  readonly ok: boolean;
  readonly kind: string;
  readonly message?: string;
  readonly kernelBytes: number;
}

export interface Reader {
  /** What became of a file; null when the thread was ended at the limit or fell. */
  readonly read: (bytes: Uint8Array) => Promise<ReadingAnswer | null>;
  readonly end: () => Promise<void>;
}

/** Reads files one after another in a thread that is taken anew when it hangs or falls. */
export function createReader(limitMs: number): Reader {
  let worker: Promise<Worker> | null = null;
  const start = () => new Promise<Worker>((resolve, reject) => {
    const started = startWithTsx(join(import.meta.dirname, "readingWorker.ts"), {});
    started.once("message", () => resolve(started));
    started.once("error", reject);
  });
  return {
    read: async (bytes) => {
      const current = await (worker ??= start());
      const answer = await new Promise<ReadingAnswer | null>((resolve) => {
        const timer = setTimeout(() => resolve(null), limitMs);
        const done = (value: ReadingAnswer | null) => {
          clearTimeout(timer);
          resolve(value);
        };
        current.once("message", done);
        current.once("error", () => done(null));
        current.postMessage(Uint8Array.from(bytes));
      });
      if (answer === null) {
        worker = null;
        await current.terminate();
      }
      return answer;
    },
    end: async () => void (await (await worker)?.terminate()),
  };
}
