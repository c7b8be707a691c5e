import type { Role } from "@/lib/schemas/role";

/** Whoever is signed in, as the database has them at this request. */
export interface SignedInPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}
