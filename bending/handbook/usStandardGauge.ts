/** The gauges that have an entry. */
export const GAUGE_RANGE: Readonly<Record<"from" | "to", number>> = { from: 7, to: 30 };

/** US Standard Gauge, inches: pounds a square foot over 40 gives inches of wrought iron; sixteenths down to 640ths (15 U.S.C. 206). */
export const usStandardGauge: Readonly<Record<number, number>> = {
  7: 3 / 16, 8: 11 / 64, 9: 5 / 32, 10: 9 / 64, 11: 1 / 8, 12: 7 / 64, 13: 3 / 32, 14: 5 / 64, 15: 9 / 128, 16: 1 / 16,
  17: 9 / 160, 18: 1 / 20, 19: 7 / 160, 20: 3 / 80, 21: 11 / 320, 22: 1 / 32, 23: 9 / 320, 24: 1 / 40, 25: 7 / 320,
  26: 3 / 160, 27: 11 / 640, 28: 1 / 64, 29: 9 / 640, 30: 1 / 80,
};
