import { database } from "@/db/client";
import { findMaterials } from "@/db/materials/findMaterials";
import { writeCsv } from "@/lib/csv/writeCsv";
import { materialCsvColumns } from "@/lib/schemas/materialCsvColumns";
import { materialToCsv } from "@/lib/schemas/materialToCsv";

/** The shop's materials as a table with every value and its source, withdrawn ones too. */
export async function exportMaterials(separator: "comma" | "semicolon"): Promise<string> {
  const rows = await findMaterials(database());
  return writeCsv(materialCsvColumns, rows.map(({ facts }) => materialToCsv(facts)), separator === "semicolon" ? ";" : ",");
}
