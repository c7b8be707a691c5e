import type { Connection } from "../connection";
import type { User } from "./user";
import { userColumns, userFromRow, type UserRow } from "./userRow";

export async function findUserById(db: Connection, id: string): Promise<User | null> {
  const row = await db<UserRow>("users").where({ id }).first(...userColumns);
  return row ? userFromRow(row) : null;
}
