/** Bends of one stroke as people read them: "b1", "left + right". */
export const formatBends = (bends: readonly string[]): string => bends.join(" + ");
