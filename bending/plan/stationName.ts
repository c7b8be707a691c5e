/** Stations are lettered as they are set: A, B, C. */
export const stationName = (index: number): string => String.fromCharCode(65 + index);
