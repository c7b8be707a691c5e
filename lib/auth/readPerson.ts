import { getToken } from "next-auth/jwt";
import { NextRequest } from "next/server";
import { database } from "@/db/client";
import { findUserById } from "@/db/users/findUserById";
import { env } from "@/lib/env";
import { sessionCookieName } from "./sessionCookieName";
import type { SignedInPerson } from "./signedInPerson";

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Whoever sends these headers: the session cookie names them, the database says what they may do today. */
export async function readPerson(headers: Headers): Promise<SignedInPerson | null> {
  const cookie = headers.get("cookie");
  if (!cookie) return null;
  const token = await getToken({
    req: new NextRequest("http://session.invalid", { headers: { cookie } }),
    secret: env.authSecret,
    cookieName: sessionCookieName(headers),
  });
  if (!token?.sub || !uuid.test(token.sub)) return null;
  const user = await findUserById(database(), token.sub);
  if (!user || user.disabledAt) return null;
  return { id: user.id, name: user.name, email: user.email, role: user.role };
}
