import type { Tool } from "../../tooling/tool";

/** mm. From the frontmost to the rearmost point of a tool. */
export const bodyWidth = ({ profile }: Tool): number => Math.max(...profile.map(([x]) => x)) - Math.min(...profile.map(([x]) => x));
