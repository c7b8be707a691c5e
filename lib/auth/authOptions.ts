import type { AuthOptions } from "next-auth";
import CredentialsProvider from "next-auth/providers/credentials";
import { env } from "@/lib/env";
import { authorizeSignIn } from "./authorizeSignIn";
import { networkAddress } from "./networkAddress";
import { overHttps } from "./overHttps";
import { readPerson } from "./readPerson";
import { recordSignOut } from "./recordSignOut";
import { sessionCookieName } from "./sessionCookieName";

/** One shift with its overtime; every use of the site within it starts it anew. */
const sessionSeconds = 12 * 60 * 60;

/** next-auth's settings for one request: cookies depend on whether it came over https, limits on where it came from. */
export function authOptions(headers: Headers): AuthOptions {
  const secure = overHttps(headers);
  return {
    secret: env.authSecret,
    useSecureCookies: secure,
    session: { strategy: "jwt", maxAge: sessionSeconds },
    pages: { signIn: "/sign-in", error: "/sign-in", signOut: "/sign-in" },
    cookies: {
      sessionToken: { name: sessionCookieName(headers), options: { httpOnly: true, sameSite: "lax", path: "/", secure } },
    },
    providers: [
      CredentialsProvider({
        credentials: { email: { label: "E-mail", type: "email" }, password: { label: "Password", type: "password" } },
        authorize: (credentials) => authorizeSignIn(credentials, networkAddress(headers)),
      }),
    ],
    callbacks: {
      jwt: ({ token }) => ({ sub: token.sub ?? "" }),
      session: async ({ session }) => {
        const person = await readPerson(headers);
        return person ? { expires: session.expires, user: person } : { expires: session.expires };
      },
    },
    events: {
      signOut: async ({ token }) => {
        if (token?.sub) await recordSignOut(token.sub);
      },
    },
  };
}
