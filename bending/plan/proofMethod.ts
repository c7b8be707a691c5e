import type { VariantAnswer } from "./solveVariant";

/** Says what an answer is proven over, and nothing more. */
export function proofMethod(answers: readonly VariantAnswer[]): string {
  const layouts = answers.reduce((sum, answer) => sum + answer.layouts, 0);
  const pairs = Math.max(0, ...answers.map((answer) => answer.pairs));
  const flats = answers.length > 1 ? `, ${answers.length} V openings` : "";
  if (answers.length > 0 && answers.every(({ deadEnds }) => deadEnds !== null)) {
    return `every order and front with all ${pairs} tool pairs${flats}, each bend with the shortest station that the pieces make: none clears`;
  }
  return `best first over all orders and fronts with ${pairs} tool pairs${flats}: all beds of one station, and of two or three stations of the likeliest pairs; ` +
    `${layouts} beds searched, the rest cannot be better by the bound of the unhindered order`;
}
