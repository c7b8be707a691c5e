import { materialById } from "@/bending/handbook/materials";
import { invariant } from "@/bending/core/invariant";
import { trialsOf, type TrialSeed } from "./bendTrialsOf";

interface Row {
  readonly material: string;
  readonly thickness: number;
  readonly vOpening: number;
  readonly angle: number;
  readonly count: number;
  readonly batch: string;
  readonly day: string;
  readonly by: string;
  /** How far this trial (from 0) lies off, in mm of deduction, and what the notebook says of it. */
  readonly off?: readonly [index: number, millimetres: number, note: string];
}

const greta = "Greta Sommer";
const owen = "Owen Pritchard";

/** What was bent in the invented shop: its main sheets over the dies that it has. Two trials lie apart, one value stands on a single strip. */
const rows: readonly Row[] = [
  { material: "S235", thickness: 1.5, vOpening: 8, angle: 90, count: 5, batch: "R-2207", day: "2025-03-11", by: greta },
  { material: "S235", thickness: 1.5, vOpening: 12, angle: 90, count: 4, batch: "R-2207", day: "2025-03-11", by: greta },
  { material: "S235", thickness: 2, vOpening: 12, angle: 90, count: 6, batch: "R-2318", day: "2025-04-02", by: greta },
  { material: "S235", thickness: 2, vOpening: 12, angle: 45, count: 3, batch: "R-2318", day: "2025-04-02", by: greta },
  { material: "S235", thickness: 2, vOpening: 12, angle: 120, count: 3, batch: "R-2318", day: "2025-04-03", by: owen },
  { material: "S235", thickness: 2, vOpening: 16, angle: 90, count: 6, batch: "R-2401", day: "2025-05-20", by: owen, off: [4, 0.34, "strip may have stood askew at the gauge"] },
  { material: "S235", thickness: 3, vOpening: 20, angle: 90, count: 5, batch: "R-2355", day: "2025-06-05", by: greta },
  { material: "S235", thickness: 3, vOpening: 24, angle: 90, count: 4, batch: "R-2355", day: "2025-06-05", by: greta },
  { material: "1.4301", thickness: 1, vOpening: 6, angle: 90, count: 3, batch: "N-0871", day: "2025-06-24", by: owen },
  { material: "1.4301", thickness: 1, vOpening: 8, angle: 90, count: 6, batch: "N-0871", day: "2025-06-24", by: owen, off: [2, -0.27, ""] },
  { material: "1.4301", thickness: 1.5, vOpening: 12, angle: 90, count: 4, batch: "N-0902", day: "2025-07-08", by: greta },
  { material: "1.4301", thickness: 1.5, vOpening: 10, angle: 90, count: 1, batch: "N-0902", day: "2025-07-08", by: greta },
  { material: "AW-5754-H22", thickness: 2, vOpening: 12, angle: 90, count: 3, batch: "A-155", day: "2025-09-16", by: owen },
  { material: "AW-5754-H22", thickness: 2, vOpening: 16, angle: 90, count: 5, batch: "A-155", day: "2025-09-16", by: owen },
  { material: "AW-5754-H22", thickness: 2, vOpening: 16, angle: 30, count: 3, batch: "A-155", day: "2025-09-17", by: owen },
  { material: "AW-5754-H22", thickness: 2, vOpening: 20, angle: 90, count: 4, batch: "A-162", day: "2025-10-14", by: greta },
];

/** Every trial of the demonstration, in the order in which they were entered. */
export const bendTrials: readonly TrialSeed[] = rows.flatMap((row, index) => {
  const material = materialById(row.material);
  invariant(material !== undefined, `the demonstration has the material ${row.material}`);
  return trialsOf({ ...row, material, seed: index + 1 });
});

/** Left out by the engineer, so that the demonstration shows how that looks. */
export const excludedTrial = { index: 7, reason: "measured before the strip had cooled after deburring" } as const;
