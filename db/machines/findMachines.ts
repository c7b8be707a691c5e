import type { Connection } from "../connection";
import type { MachineRow } from "./machineRow";

export async function findMachines(db: Connection): Promise<readonly MachineRow[]> {
  return db<MachineRow>("machines").select("*").orderBy("name");
}
