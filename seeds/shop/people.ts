import type { Role } from "@/lib/schemas/role";

export interface DemonstrationPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

/** The people of the invented shop; the addresses end in `.example` and reach nobody. */
export const people: readonly DemonstrationPerson[] = [
  { name: "Ines Okafor", email: "ines.okafor@ravelstreet.example", role: "engineer" },
  { name: "Tomasz Wróbel", email: "tomasz.wrobel@ravelstreet.example", role: "engineer" },
  { name: "Bea Lindqvist", email: "bea.lindqvist@ravelstreet.example", role: "operator" },
  { name: "Sami Haddad", email: "sami.haddad@ravelstreet.example", role: "operator" },
  { name: "Greta Sommer", email: "greta.sommer@ravelstreet.example", role: "toolroom" },
  { name: "Owen Pritchard", email: "owen.pritchard@ravelstreet.example", role: "toolroom" },
  { name: "Rosa Delacourt", email: "rosa.delacourt@ravelstreet.example", role: "manager" },
];
