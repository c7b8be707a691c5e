import { headers } from "next/headers";
import { redirect } from "next/navigation";
import { isConnectionLost } from "@/db/isConnectionLost";
import { pageAccess, type PagePath } from "./accessTable";
import { currentPerson } from "./currentPerson";
import { databaseLostDigest } from "./databaseLostDigest";
import { mayEnter } from "./mayEnter";
import { askedPathHeader } from "./ownHeaders";
import type { SignedInPerson } from "./signedInPerson";

type GuardedPage = Exclude<PagePath, "/sign-in">;

/** The first line of every page: signed out goes to sign in and comes back, a role that may not goes to /forbidden. */
export async function requirePage(path: GuardedPage): Promise<SignedInPerson> {
  const person = await currentPerson().catch((thrown: unknown) => {
    if (!isConnectionLost(thrown)) throw thrown;
    throw Object.assign(new Error("The database cannot be reached."), { digest: databaseLostDigest });
  });
  if (!person) {
    const asked = (await headers()).get(askedPathHeader) ?? "/";
    redirect(asked === "/" ? "/sign-in" : `/sign-in?next=${encodeURIComponent(asked)}`);
  }
  if (!mayEnter(person.role, pageAccess[path])) redirect("/forbidden");
  return person;
}
