import { invariant } from "@/bending/core/invariant";
import type { Machine } from "@/bending/tooling/machine";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";

/** The machine of a document that was checked when it was stored. */
export function machineOf(document: unknown): Machine {
  const machine = readMachineDocument(document);
  invariant(machine.ok, "a stored machine document can be read");
  return machine.value;
}
