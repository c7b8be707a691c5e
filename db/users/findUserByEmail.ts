import type { Connection } from "../connection";
import type { User } from "./user";
import { userColumns, userFromRow, type UserRow } from "./userRow";

/** Addresses are kept in lower case. */
export async function findUserByEmail(db: Connection, email: string): Promise<User | null> {
  const row = await db<UserRow>("users").where({ email: email.trim().toLowerCase() }).first(...userColumns);
  return row ? userFromRow(row) : null;
}
