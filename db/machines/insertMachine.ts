import type { Machine } from "@/bending/tooling/machine";
import type { Connection } from "../connection";

export interface NewMachine {
  /** Made up when absent. */
  readonly id?: string;
  /** Read from `document`, in millimetres. */
  readonly machine: Machine;
  readonly document: unknown;
}

export async function insertMachine(db: Connection, { id, machine, document }: NewMachine): Promise<string> {
  const [row] = await db("machines")
    .insert({
      ...(id === undefined ? {} : { id }),
      name: machine.name,
      bed_length_mm: machine.bedLength,
      max_force_kn: machine.maxForce,
      daylight_mm: machine.daylight,
      punch_tang: machine.punchTang,
      die_tang: machine.dieTang,
      document: JSON.stringify(document),
    })
    .returning<{ id: string }[]>("id");
  return row!.id;
}
