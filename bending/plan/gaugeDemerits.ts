/** A step held by fewer than two fingers is allowed and shown, but avoided where any order avoids it. */
export const gaugeDemerits = (fingers: number): number => Math.max(0, 2 - fingers);
