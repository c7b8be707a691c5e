/** Fewer pieces go before less to carry: one number for both, exact while all runs together are under a kilometre. */
const PER_PIECE = 1e6;

export const carryCost = (pieces: number, length: number): number => pieces * PER_PIECE + length;

export const piecesOfCost = (cost: number): number => Math.floor(cost / PER_PIECE);

/** Two costs nearer than this are equal. */
export const SAME_COST = 1e-6;
