/** The name of the slanted face (and of its bend) between a face and the flange that is offset from it. */
export const stepOf = (flangeId: string): string => `${flangeId}-step`;
