/** [from, to] with from <= to. */
export type Interval = readonly [number, number];
