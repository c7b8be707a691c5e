import { csvRowOf } from "./csvRowOf";
import { trialView } from "./trialView";
import { materialLookup } from "../materialLookup";
import { findAllTrials } from "@/db/bendTrials/findAllTrials";
import { database } from "@/db/client";
import { numberColumn } from "@/lib/csv/numberColumn";
import { optionalColumn } from "@/lib/csv/optionalColumn";
import { textColumn } from "@/lib/csv/textColumn";
import { writeCsv } from "@/lib/csv/writeCsv";
import { bendTrialCsv } from "@/lib/schemas/bendTrialCsv";

/** What is read back, and beside it what comes of each trial, which a file that is read back leaves aside. */
const columns = {
  ...bendTrialCsv,
  deduction: optionalColumn(numberColumn("deduction", { units: { mm: 1 } })),
  deductionError: optionalColumn(numberColumn("uncertainty of deduction", { units: { mm: 1 } })),
  k: optionalColumn(numberColumn("k")),
  state: textColumn("state", 20),
  reason: optionalColumn(textColumn("reason", 500)),
};

/** Every trial as a CSV file, those that do not count and those withdrawn too. */
export async function exportTrials(material: string | undefined, separator: "," | ";"): Promise<string> {
  const db = database();
  const materials = await materialLookup(db);
  const rows = await findAllTrials(db, { material, withdrawn: true });
  return writeCsv(columns, rows.map((row) => {
    const { result, state, excluded, withdrawn } = trialView(row, materials(row.material_id));
    return {
      ...csvRowOf(row),
      deduction: result === null ? null : rounded(result.deduction.value, 4),
      deductionError: result === null ? null : rounded(result.deduction.expanded, 4),
      k: result === null ? null : rounded(result.k.value, 4),
      state,
      reason: (withdrawn ?? excluded)?.reason ?? null,
    };
  }), separator);
}

const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));
