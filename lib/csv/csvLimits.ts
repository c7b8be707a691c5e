/** The most that is read at once. */
export const csvLimits = {
  lines: 5000,
  bytes: 2_000_000,
  /** Of the JSON that carries a text of so many bytes: line ends and quotation marks are escaped in it. */
  bodyBytes: 4_500_000,
} as const;
