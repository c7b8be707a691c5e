/** How much a search has done and how much it may do; counted in steps, so that an answer does not hang on a clock. */
export interface SearchEffort {
  readonly step: () => void;
  readonly steps: () => number;
  /** Ends the search: there is more to look at than can be. */
  readonly giveUp: () => void;
  /** True once the search must end; it stays true. */
  readonly spent: () => boolean;
  /** An effort for a part of the search: so many steps at the most, all of them counted in the whole as well. */
  readonly portion: (most: number) => SearchEffort;
}

/** How many steps pass between two looks at the clock of the caller. */
const LOOK_EVERY = 256;

export function createSearchEffort(most: number, shouldStop: () => boolean): SearchEffort {
  let [steps, stopped] = [0, false];
  const effort: SearchEffort = {
    step: () => {
      steps += 1;
      if (steps > most || (steps % LOOK_EVERY === 0 && shouldStop())) stopped = true;
    },
    steps: () => steps,
    giveUp: () => { stopped = true; },
    spent: () => stopped,
    portion: (part) => portionOf(effort, part),
  };
  return effort;
}

function portionOf(whole: SearchEffort, most: number): SearchEffort {
  const from = whole.steps();
  let stopped = false;
  const part: SearchEffort = {
    step: () => {
      whole.step();
      if (whole.steps() - from > most) stopped = true;
    },
    steps: () => whole.steps() - from,
    giveUp: () => { stopped = true; },
    spent: () => stopped || whole.spent(),
    portion: (less) => portionOf(part, less),
  };
  return part;
}
