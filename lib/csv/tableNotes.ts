import type { CsvColumns } from "./csvColumn";
import type { CsvTable } from "./csvTable";

const separatorNames = { ",": "commas", ";": "semicolons", "\t": "tabs" } as const;

/** How a file was understood, in sentences. */
export function tableNotes({ separator, decimal, unknown }: CsvTable<CsvColumns>): readonly string[] {
  const how = `Values are parted by ${separatorNames[separator]}, decimals written with ${decimal === "," ? "a comma" : "a point"}.`;
  return unknown.length === 0 ? [how] : [how, `Not known and left aside: ${unknown.map((words) => `"${words}"`).join(", ")}.`];
}
