/** Rounded to nine decimals (mm or degrees): the noise of the last digits goes, corners that are one stay one. */
export const tidy = (value: number): number => Math.round(value * 1e9) / 1e9 + 0;
