import type { Role } from "@/lib/schemas/role";
import type { PagePath } from "./accessTable";

const homes = { engineer: "/parts", operator: "/floor", toolroom: "/tools", manager: "/sheets" } as const satisfies Record<Role, PagePath>;

/** Where the work of a role begins. */
export function homePath(role: Role): (typeof homes)[Role] {
  return homes[role];
}
