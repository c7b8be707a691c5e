import { insertEvent } from "@/db/audit/insertEvent";
import { database } from "@/db/client";
import { findUserById } from "@/db/users/findUserById";

export async function recordSignOut(personId: string): Promise<void> {
  const user = await findUserById(database(), personId);
  if (user) await insertEvent(database(), { actorId: user.id, actor: user.name, action: "signed out", subject: user.email });
}
