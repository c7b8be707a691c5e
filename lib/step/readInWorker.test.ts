import { join } from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import type { WorkerOptions } from "node:worker_threads";
import { mustBuild } from "@/tests/step/mustBuild";
import { solidOfPart } from "@/tests/step/solidOfPart";
import { startWithTsx } from "@/tests/step/startWithTsx";
import { stepOfShape } from "@/tests/step/stepOfShape";
import { createTurns } from "./createTurns";
import { loadKernel } from "./loadKernel";
import { readInWorker } from "./readInWorker";
import { readStep } from "./readStep";

const start = (options: WorkerOptions) => startWithTsx(join(import.meta.dirname, "stepWorker.ts"), options);
const never = new AbortController().signal;

let file: Uint8Array;
/** Bytes that may be handed over to the thread. */
const task = () => ({ bytes: Uint8Array.from(file), body: null });
beforeAll(async () => {
  const { kernel } = await loadKernel();
  file = stepOfShape(kernel, solidOfPart(kernel, mustBuild({ format: "part/1", name: "Angle", units: "mm", material: "S235", thickness: 2, profile: { width: 60, legs: [40, 30], bends: [{ angle: 90, direction: "up" }] } })));
});

describe("the reading thread", () => {
  test("reads a file", async () => {
    expect(await readInWorker(task(), { start, signal: never })).toMatchObject({ ok: true, value: { kind: "part", part: { bends: [{ direction: "up" }] } } });
  });

  test("is ended when its time is over, and says so", async () => {
    const answer = await readInWorker(task(), { start, signal: never, milliseconds: 1 });
    expect(answer).toMatchObject({ ok: false, error: { kind: "too-long", message: expect.stringContaining("within 0 seconds") } });
  });

  test("is ended when the request is broken off, before or after it began", async () => {
    const controller = new AbortController();
    const answer = readInWorker(task(), { start, signal: controller.signal });
    controller.abort();
    expect(await answer).toMatchObject({ ok: false, error: { message: "Reading was stopped." } });
    expect(await readInWorker(task(), { start, signal: controller.signal })).toMatchObject({ ok: false, error: { message: "Reading was stopped." } });
  });

  test("is ended when its own data outgrow their limit", async () => {
    const hungry = (options: WorkerOptions) => startWithTsx(join(import.meta.dirname, "../../tests/step/hungryWorker.ts"), options);
    expect(await readInWorker(task(), { start: hungry, signal: never, heapMb: 96 })).toMatchObject({ ok: false, error: { kind: "too-much-memory" } });
  });
});

test("the kernel stops growing at its limit, and what failed then is said to be for want of memory", async () => {
  const small = await loadKernel(1);
  expect(small.ranOut()).toBe(false);
  expect(() => small.kernel.wasmMemory.grow(1)).toThrow("at its limit");
  expect(small.ranOut()).toBe(true);
  const damaged = Buffer.from(Buffer.from(file).toString("latin1").replace(/MANIFOLD_SOLID_BREP/, "NOTHING"), "latin1");
  expect(readStep({ kernel: small.kernel, ranOut: () => false }, damaged)).toMatchObject({ ok: false, error: { kind: "no-solid" } });
  expect(readStep(small, damaged)).toMatchObject({ ok: false, error: { kind: "too-much-memory" } });
});

test("turns are given one at a time, the rest wait, and too many are refused", async () => {
  const turn = createTurns(1, 1);
  const first = await turn();
  let second = false;
  const waiting = turn()?.then((giveBack) => {
    second = true;
    return giveBack;
  });
  expect([turn(), second]).toEqual([null, false]);
  first?.();
  (await waiting)?.();
  expect([second, turn()]).toEqual([true, expect.any(Promise)]);
});
