import { headers } from "next/headers";
import { redirect } from "next/navigation";
import { pageAccess, type PagePath } from "./accessTable";
import { currentPerson } from "./currentPerson";
import { mayEnter } from "./mayEnter";
import { orDatabaseLost } from "./orDatabaseLost";
import { askedPathHeader } from "./ownHeaders";
import type { SignedInPerson } from "./signedInPerson";

type GuardedPage = Exclude<PagePath, "/sign-in">;

/** The first line of every page: signed out goes to sign in and comes back, a role that may not goes to /forbidden. */
export async function requirePage(path: GuardedPage): Promise<SignedInPerson> {
  const person = await orDatabaseLost(currentPerson());
  if (!person) {
    const asked = (await headers()).get(askedPathHeader) ?? "/";
    redirect(asked === "/" ? "/sign-in" : `/sign-in?next=${encodeURIComponent(asked)}`);
  }
  if (!mayEnter(person.role, pageAccess[path])) redirect("/forbidden");
  return person;
}
