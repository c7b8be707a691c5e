import { getToken } from "next-auth/jwt";
import { NextRequest } from "next/server";
import { env } from "@/lib/env";
import { sessionCookieName } from "./sessionCookieName";

/** The id of the person that the session cookie names, when the cookie is genuine and not too old. Says nothing of what they may do. */
export async function readToken(headers: Headers): Promise<string | null> {
  const cookie = headers.get("cookie");
  if (!cookie) return null;
  const token = await getToken({
    req: new NextRequest("http://session.invalid", { headers: { cookie } }),
    secret: env.authSecret,
    cookieName: sessionCookieName(headers),
  });
  return token?.sub || null;
}
