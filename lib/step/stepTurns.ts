import { createTurns } from "./createTurns";

const store = globalThis as typeof globalThis & { foldwrightStepTurns?: ReturnType<typeof createTurns> };

/** The turns at the geometry kernel of this process, whatever is reloaded around them: one file at a time, each may take much memory. */
export function stepTurns(): ReturnType<typeof createTurns> {
  store.foldwrightStepTurns ??= createTurns(1, 8);
  return store.foldwrightStepTurns;
}
