import type { Role } from "../../../lib/schemas/role";
import { people } from "../../../seeds/shop/people";

/** The first person of the demonstration shop who has this role. */
export function emailOf(role: Role): string {
  const person = people.find((one) => one.role === role);
  if (!person) throw new Error(`nobody in the demonstration shop is ${role}`);
  return person.email;
}
