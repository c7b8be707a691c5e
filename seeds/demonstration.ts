import type { Knex } from "knex";
import { readMachineDocument } from "@/bending/tooling/readMachineDocument";
import { readToolingDocument } from "@/bending/tooling/readToolingDocument";
import { insertEvent } from "@/db/audit/insertEvent";
import { insertMachine } from "@/db/machines/insertMachine";
import { insertMaterials } from "@/db/materials/insertMaterials";
import { insertPart } from "@/db/parts/insertPart";
import { insertTool } from "@/db/tools/insertTool";
import { insertUser } from "@/db/users/insertUser";
import { hashPassword } from "@/lib/auth/hashPassword";
import { loadShopTable } from "@/lib/services/bendTable/loadShopTable";
import { readPart } from "@/lib/services/parts/readPart";
import { mustRead } from "./mustRead";
import { seedBendTrials } from "./seedBendTrials";
import { demonstrationPassword } from "./shop/demonstrationPassword";
import { machines } from "./shop/machines";
import { materials } from "./shop/materials";
import { parts } from "./shop/parts";
import { people } from "./shop/people";
import { tooling } from "./shop/tools";
import { pieceStates } from "./shop/tools/pieceStates";

/** Puts the demonstration shop into a database that nobody is in yet, all or nothing; tells whether it did. */
export async function seedDemonstration(knex: Knex): Promise<boolean> {
  return knex.transaction(async (db) => {
    await db.raw("lock table users in exclusive mode");
    if (await db("users").first("id")) return false;
    await insertMaterials(db, materials, "built-in values, each with its source");
    const { engineer, toolroom } = await seedPeople(db);
    const brakes = await seedMachines(db);
    await seedTools(db, brakes);
    await seedBendTrials(db, { toolroom, engineer });
    await seedParts(db, engineer);
    await insertEvent(db, { actorId: null, actor: "installation", action: "put in the demonstration shop", subject: "Ravel Street Instruments" });
    return true;
  });
}

/** Answers the ids of the first engineer and of the first toolroom keeper. */
async function seedPeople(db: Knex): Promise<{ readonly engineer: string; readonly toolroom: string }> {
  const first = new Map<string, string>();
  for (const person of people) {
    const passwordHash = mustRead("password", await hashPassword(demonstrationPassword));
    const { id, role } = await insertUser(db, { ...person, passwordHash });
    if (!first.has(role)) first.set(role, id);
  }
  return { engineer: first.get("engineer") ?? "", toolroom: first.get("toolroom") ?? "" };
}

async function seedMachines(db: Knex): Promise<readonly string[]> {
  const ids: string[] = [];
  for (const document of machines) {
    ids.push(await insertMachine(db, { machine: mustRead(document.name, readMachineDocument(document)), document }));
  }
  return ids;
}

async function seedTools(db: Knex, brakes: readonly string[]): Promise<void> {
  for (const tool of mustRead("tooling", readToolingDocument(tooling))) {
    const pieces = tool.pieces.map((piece) => {
      const away = pieceStates[piece.id];
      const machineId = away?.state === "at brake" ? brakes[away.brake] : undefined;
      return {
        code: piece.id, lengthMm: piece.length, horn: piece.horn, rack: piece.rack ?? "",
        ...(away ? { state: away.state } : {}),
        ...(machineId ? { machineId } : {}),
      };
    });
    await insertTool(db, tool, pieces);
  }
}

async function seedParts(db: Knex, by: string): Promise<void> {
  const shop = await loadShopTable(db);
  for (const { number, note, document } of parts) {
    const read = mustRead(document.name, readPart(document, shop));
    await insertPart(db, number, { ...read, note, by });
  }
}
