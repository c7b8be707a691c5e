import { hash, truncates } from "bcryptjs";
import { fail, ok, type Result } from "@/bending/core/result";
import { env } from "@/lib/env";

const shortest = 10;

/** bcrypt reads 72 bytes; a longer password would be cut, so it is refused. */
export async function hashPassword(password: string): Promise<Result<string, string>> {
  if (password.length < shortest) return fail(`The password must have at least ${shortest} characters.`);
  if (truncates(password)) return fail("The password must have at most 72 bytes.");
  return ok(await hash(password, env.bcryptRounds));
}
