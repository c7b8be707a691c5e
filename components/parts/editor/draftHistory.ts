/** What is typed now, what it was before each change, what was taken back, and when and in which field the last change was made. */
export interface DraftHistory<T> {
  readonly draft: T;
  readonly past: readonly T[];
  readonly future: readonly T[];
  /** Milliseconds. */
  readonly at: number;
  /** The text field; null: an act such as adding a flange, which stands by itself. */
  readonly field: string | null;
}

/** Changes in one field that follow one another faster are taken back together: a number that is typed is one change. */
const TOGETHER_MS = 800;

export const beginHistory = <T>(draft: T): DraftHistory<T> => ({ draft, past: [], future: [], at: 0, field: null });

/** What was taken back cannot be brought again after a new change. */
export function changeHistory<T>({ draft, past, at, field: before }: DraftHistory<T>, next: T, now: number, field: string | null): DraftHistory<T> {
  const together = field !== null && field === before && now - at < TOGETHER_MS;
  return { draft: next, past: together ? past : [...past, draft], future: [], at: now, field };
}

export function undoHistory<T>(history: DraftHistory<T>): DraftHistory<T> {
  const back = history.past.at(-1);
  return back === undefined ? history : { draft: back, past: history.past.slice(0, -1), future: [history.draft, ...history.future], at: 0, field: null };
}

export function redoHistory<T>(history: DraftHistory<T>): DraftHistory<T> {
  const [again, ...rest] = history.future;
  return again === undefined ? history : { draft: again, past: [...history.past, history.draft], future: rest, at: 0, field: null };
}
