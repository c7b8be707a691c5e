import type { Connection } from "../connection";
import type { MachineRow } from "./machineRow";

export async function findMachine(db: Connection, id: string): Promise<MachineRow | undefined> {
  return db<MachineRow>("machines").where({ id }).first("*");
}
