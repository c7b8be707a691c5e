import type { User, UserRole } from "./user";

export interface UserRow {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly role: UserRole;
  readonly password_hash: string;
  readonly disabled_at: Date | null;
  readonly created_at: Date;
}

export const userColumns = ["id", "email", "name", "role", "password_hash", "disabled_at", "created_at"] as const;

export const userFromRow = (row: UserRow): User => ({
  id: row.id,
  email: row.email,
  name: row.name,
  role: row.role,
  passwordHash: row.password_hash,
  disabledAt: row.disabled_at,
  createdAt: row.created_at,
});
