import { figures } from "./figures";
import type { Question } from "./question";

/** The sheet and the bend as figures of a formula. */
export const bendFigures = (q: Question) => ({
  α: figures.angle(q.degrees), R: figures.length(q.insideRadius), t: figures.length(q.thickness), V: figures.length(q.vOpening), R_m: figures.stress(q.tensile),
});
