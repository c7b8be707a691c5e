import type { Punch } from "../../tooling/tool";

/** Is the punch as wide in front as behind? */
export const isStraight = ({ profile }: Punch): boolean => Math.abs(Math.max(...profile.map(([x]) => x)) + Math.min(...profile.map(([x]) => x))) < 1e-6;
