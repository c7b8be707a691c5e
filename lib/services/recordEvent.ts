import { insertEvent } from "@/db/audit/insertEvent";
import type { Connection } from "@/db/connection";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";

/** Writes down who did what, in the transaction of the change itself. */
export async function recordEvent(within: Connection, person: SignedInPerson, action: string, subject: string, detail = ""): Promise<void> {
  await insertEvent(within, { actorId: person.id, actor: person.name, action, subject, detail });
}
