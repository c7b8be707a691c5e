import type { MaterialGroup } from "@/bending/handbook/material";

/**
 * Sheet gauges 7 to 30 in inches. Steel: manufacturers' standard gauge (US gauge x 40 / 41.82); stainless: US
 * standard gauge; aluminium: 0.005 x 92^((36 - g) / 39), the wire gauge formula. Nominal values: measure the sheet.
 */
const first = 7;
const steel = [0.1793, 0.1644, 0.1495, 0.1345, 0.1196, 0.1046, 0.0897, 0.0747, 0.0673, 0.0598, 0.0538, 0.0478, 0.0418, 0.0359, 0.0329, 0.0299, 0.0269, 0.0239, 0.0209, 0.0179, 0.0164, 0.0149, 0.0135, 0.012];
const stainless = [0.1875, 0.1719, 0.1562, 0.1406, 0.125, 0.1094, 0.0937, 0.0781, 0.0703, 0.0625, 0.0562, 0.05, 0.0437, 0.0375, 0.0344, 0.0312, 0.0281, 0.025, 0.0219, 0.0187, 0.0172, 0.0156, 0.0141, 0.0125];
const aluminium = [0.1443, 0.1285, 0.1144, 0.1019, 0.0907, 0.0808, 0.072, 0.0641, 0.0571, 0.0508, 0.0453, 0.0403, 0.0359, 0.032, 0.0285, 0.0253, 0.0226, 0.0201, 0.0179, 0.0159, 0.0142, 0.0126, 0.0113, 0.01];

const tables: Readonly<Partial<Record<MaterialGroup, readonly number[]>>> = { steel, stainless, aluminium };

/** Thickness of a gauge in inches; undefined when the material has no gauge table or the number is not in it. */
export function sheetGaugeInches(gauge: number, group: MaterialGroup): number | undefined {
  return Number.isInteger(gauge) ? tables[group]?.[gauge - first] : undefined;
}

export const sheetGaugeRange = { from: first, to: first + steel.length - 1 } as const;
