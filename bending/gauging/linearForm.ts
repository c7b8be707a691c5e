/**
 * A small error as a sum over the errors of the steps: entry 2 s is millimetres a millimetre of step s's gauge stop, entry
 * 2 s + 1 millimetres a radian of its angle.
 */
export type LinearForm = readonly number[];

export const gaugeEntry = (step: number): number => 2 * step;
export const angleEntry = (step: number): number => 2 * step + 1;
