import { encode } from "next-auth/jwt";
import { database } from "@/db/client";
import { insertUser } from "@/db/users/insertUser";
import type { User } from "@/db/users/user";
import { hashPassword } from "@/lib/auth/hashPassword";
import { roles, type Role } from "@/lib/schemas/role";
import { freshDatabase } from "./freshDatabase";

export const accessPassword = "correct <b>horse</b> battery";
const secret = "a secret for the access tests alone";

/** A database of its own with one person of every role, and the process's settings pointed at it (or at `through`, given its address). */
export async function accessPeople(through?: (url: string) => Promise<string>) {
  const fresh = await freshDatabase();
  process.env["DATABASE_URL"] = through ? await through(fresh.url) : fresh.url;
  process.env["NEXTAUTH_SECRET"] = secret;
  process.env["BCRYPT_ROUNDS"] = "4";
  const hashed = await hashPassword(accessPassword);
  if (!hashed.ok) throw new Error(hashed.error);
  const people = {} as Record<Role, User>;
  for (const role of roles) {
    people[role] = await insertUser(database(), { email: `${role}@access.example`, name: `The ${role}`, role, passwordHash: hashed.value });
  }
  const end = async () => {
    await database().destroy();
    await fresh.drop();
  };
  return { people, end };
}

/** The cookie that a browser holds after signing in: a real session token, made the way next-auth makes it. */
export async function sessionCookie(personId: string, maxAge = 600): Promise<string> {
  return `foldwright.session=${await encode({ token: { sub: personId }, secret, maxAge })}`;
}

export interface Asked {
  readonly method?: string;
  readonly cookie?: string;
  readonly headers?: Record<string, string>;
  readonly body?: BodyInit;
}

/** A request as a browser on this site sends it. */
export function siteRequest(path: string, { method = "GET", cookie, headers = {}, body }: Asked = {}): Request {
  return new Request(`http://foldwright.test${path}`, {
    method,
    headers: { ...(method === "GET" ? {} : { origin: "http://foldwright.test" }), ...(cookie ? { cookie } : {}), ...headers },
    ...(body === undefined ? {} : { body, duplex: "half" }),
  } as RequestInit);
}
