import { compare, hash, truncates } from "bcryptjs";
import { env } from "@/lib/env";

let decoy: Promise<string> | undefined;

/** Without a hash (unknown account) it takes as long as with one, so that the time does not tell who has an account. */
export async function passwordMatches(password: string, hashed: string | null): Promise<boolean> {
  decoy ??= hash("no account has this password", env.bcryptRounds);
  const matches = await compare(password, hashed ?? (await decoy));
  return matches && hashed !== null && !truncates(password);
}
