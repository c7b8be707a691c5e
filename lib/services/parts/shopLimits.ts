import { shopLimitsOf } from "@/bending/findings/shopLimitsOf";
import type { ShopLimits } from "@/bending/findings/shopLimits";
import { stockSheets } from "@/bending/findings/stockSheets";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { database } from "@/db/client";
import { findMachines } from "@/db/machines/findMachines";
import { findToolsInService } from "@/db/tools/findToolsInService";

/** What the shop's brakes and its tools in service can do, for judging a part before it is planned. A machine that cannot be read does not count. */
export async function shopLimits(): Promise<ShopLimits> {
  const db = database();
  const [tools, rows] = await Promise.all([findToolsInService(db), findMachines(db)]);
  const machines = rows.flatMap((row) => { const read = readMachineDocument(row.document); return read.ok ? [read.value] : []; });
  return shopLimitsOf(tools, machines, stockSheets);
}
