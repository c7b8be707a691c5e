import type { Connection } from "../connection";
import type { UserRole } from "./user";

export interface UserChange {
  readonly role?: UserRole;
  readonly disabled?: boolean;
}

/** Takes effect at the person's next request; answers false when there is no such person. */
export async function updateUser(db: Connection, id: string, change: UserChange): Promise<boolean> {
  const count = await db("users").where({ id }).update({
    ...(change.role ? { role: change.role } : {}),
    ...(change.disabled === undefined ? {} : { disabled_at: change.disabled ? db.fn.now() : null }),
    updated_at: db.fn.now(),
  });
  return count === 1;
}
