import { z } from "zod";
import { isConnectionLost } from "@/db/isConnectionLost";
import { checkSignIn, type SignInRefusal } from "./checkSignIn";
import type { SignedInPerson } from "./signedInPerson";

const credentialsSchema = z.object({ email: z.string().min(1).max(254), password: z.string().min(1).max(1000) });

/** next-auth hands the message of what is thrown here to the page: always a code of signInErrors, never a reason from inside. */
export async function authorizeSignIn(credentials: unknown, address: string): Promise<SignedInPerson | null> {
  const given = credentialsSchema.safeParse(credentials);
  if (!given.success) return null;
  const checked = await checkSignIn({ ...given.data, address }).catch((thrown: unknown) => {
    console.error("sign-in:", thrown instanceof Error ? thrown.message : thrown);
    throw new Error(isConnectionLost(thrown) ? "database-lost" : "Configuration");
  });
  if (!checked.ok) throw new Error(refusalText(checked.error));
  return checked.value;
}

const refusalText = ({ code, retryAfterSeconds }: SignInRefusal): string =>
  retryAfterSeconds === undefined ? code : `${code}:${retryAfterSeconds}`;
