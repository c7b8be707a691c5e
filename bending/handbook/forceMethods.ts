export type BendMethod = "air" | "bottoming" | "coining";

export interface PublishedMethodFactor {
  readonly method: Exclude<BendMethod, "air">;
  /** What the factor multiplies. */
  readonly over: "air" | "bottoming";
  readonly factor: readonly [lowest: number, highest: number];
  readonly source: string;
  readonly seen: boolean;
}

/** Published factors of the press force over the air-bend force. They disagree widely: data to choose from, not a law. */
export const publishedMethodFactors: readonly PublishedMethodFactor[] = [
  { method: "bottoming", over: "air", factor: [3, 5], source: "trade pages", seen: true },
  { method: "coining", over: "air", factor: [5, 10], source: "trade pages", seen: true },
  { method: "bottoming", over: "air", factor: [2.5, 2.5], source: "trade chart: 150 against 60 tons a foot for each inch of thickness", seen: true },
  { method: "coining", over: "bottoming", factor: [5, 8], source: "another trade page, over bottoming", seen: true },
  { method: "bottoming", over: "air", factor: [5, 5], source: "magazine practice, from memory", seen: false },
  { method: "coining", over: "air", factor: [10, 10], source: "magazine practice, from memory", seen: false },
];

export type MethodFactors = Readonly<Record<BendMethod, number>>;

/** The upper end of the most quoted ranges, so as to err on the side of the machine's rating; a shop puts its own in their place. */
export const defaultMethodFactors: MethodFactors = { air: 1, bottoming: 5, coining: 10 };

export const DEFAULT_FACTORS_SOURCE = "Upper ends of the ranges quoted most: bottoming 3 to 5, coining 5 to 10 times air bending (trade pages); air bending as the formula gives it";
