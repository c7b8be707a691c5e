import type { Connection } from "../connection";
import type { User, UserRole } from "./user";
import { userColumns, userFromRow, type UserRow } from "./userRow";

export interface NewUser {
  /** Given for a person who must have the same id everywhere; else the database makes one. */
  readonly id?: string;
  readonly email: string;
  readonly name: string;
  readonly role: UserRole;
  readonly passwordHash: string;
}

export async function insertUser(db: Connection, person: NewUser): Promise<User> {
  const [row] = await db("users")
    .insert({
      ...(person.id ? { id: person.id } : {}),
      email: person.email.trim().toLowerCase(),
      name: person.name,
      role: person.role,
      password_hash: person.passwordHash,
    })
    .returning<UserRow[]>([...userColumns]);
  if (!row) throw new Error("users: the insert answered no row");
  return userFromRow(row);
}
