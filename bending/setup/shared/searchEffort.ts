/** How much a search has done and how much it may do; counted in steps, so that an answer does not hang on a clock. */
export interface SearchEffort {
  readonly step: () => void;
  readonly steps: () => number;
  /** Ends the search: there is more to look at than can be. */
  readonly giveUp: () => void;
  /** True once the search must end; it stays true. */
  readonly spent: () => boolean;
}

/** How many steps pass between two looks at the clock of the caller. */
const LOOK_EVERY = 256;

export function createSearchEffort(most: number, shouldStop: () => boolean): SearchEffort {
  let [steps, stopped] = [0, false];
  return {
    step: () => {
      steps += 1;
      if (steps > most || (steps % LOOK_EVERY === 0 && shouldStop())) stopped = true;
    },
    steps: () => steps,
    giveUp: () => { stopped = true; },
    spent: () => stopped,
  };
}
