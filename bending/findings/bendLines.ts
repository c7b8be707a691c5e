import type { Bend } from "../part/partModel";
import type { FindingMark } from "./finding";

/** The bend lines as marks. */
export const bendLines = (bends: readonly Bend[]): readonly FindingMark[] => bends.map(({ line: [from, to] }) => ({ kind: "line", from, to }));
