/** What is typed now, what it was before each change, what was taken back, and when the last change came. */
export interface DraftHistory<T> {
  readonly draft: T;
  readonly past: readonly T[];
  readonly future: readonly T[];
  /** Milliseconds; 0: the next change stands by itself. */
  readonly at: number;
}

/** Changes that follow one another faster are taken back together: a number that is typed is one change. */
const TOGETHER_MS = 800;

export const beginHistory = <T>(draft: T): DraftHistory<T> => ({ draft, past: [], future: [], at: 0 });

/** `together`: may be joined with the change just before. What was taken back cannot be brought again after a new change. */
export function changeHistory<T>({ draft, past, at }: DraftHistory<T>, next: T, now: number, together: boolean): DraftHistory<T> {
  return { draft: next, past: together && now - at < TOGETHER_MS ? past : [...past, draft], future: [], at: now };
}

export function undoHistory<T>(history: DraftHistory<T>): DraftHistory<T> {
  const back = history.past.at(-1);
  return back === undefined ? history : { draft: back, past: history.past.slice(0, -1), future: [history.draft, ...history.future], at: 0 };
}

export function redoHistory<T>(history: DraftHistory<T>): DraftHistory<T> {
  const [again, ...rest] = history.future;
  return again === undefined ? history : { draft: again, past: [...history.past, history.draft], future: rest, at: 0 };
}
