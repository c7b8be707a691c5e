import type { Knex } from "knex";
import { builtInMaterials } from "@/bending/handbook/materials";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { insertMachine } from "@/db/machines/insertMachine";
import { insertMaterials } from "@/db/materials/insertMaterials";
import { insertTool } from "@/db/tools/insertTool";
import { bracketMachine } from "./bracketMachine";
import { bracketDie, bracketPunch } from "./bracketTools";

/** The smallest shop: the built-in materials, one brake, one punch, one die. Answers the brake's id. */
export async function bracketShop(db: Knex): Promise<string> {
  const machine = readMachineDocument(bracketMachine);
  if (!machine.ok) throw new Error(JSON.stringify(machine.error));
  await insertMaterials(db, builtInMaterials);
  await insertTool(db, bracketPunch);
  await insertTool(db, bracketDie);
  return insertMachine(db, { machine: machine.value, document: bracketMachine });
}
