import { database } from "@/db/client";
import { findUserById } from "@/db/users/findUserById";
import { readToken } from "./readToken";
import type { SignedInPerson } from "./signedInPerson";

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Whoever sends these headers: the session cookie names them, the database says what they may do today. */
export async function readPerson(headers: Headers): Promise<SignedInPerson | null> {
  const id = await readToken(headers);
  if (!id || !uuid.test(id)) return null;
  const user = await findUserById(database(), id);
  if (!user || user.disabledAt) return null;
  return { id: user.id, name: user.name, email: user.email, role: user.role };
}
